/** Changes whenever an answer may change; stored beside every result. */
export const ENGINE_VERSION = '1.0.0';
