// babel-preset-expo finds react-native-worklets by itself and adds its plugin; nothing else is needed.
module.exports = function babelConfig(api) {
  api.cache(true);
  return { presets: ['babel-preset-expo'] };
};
