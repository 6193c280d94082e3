declare module '*.ttf' {
  /** What expo-font loads from. */
  const source: string;
  export default source;
}
