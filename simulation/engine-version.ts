/** Changes whenever a result can change: a frozen result names the engine that computed it. */
export const ENGINE_VERSION = '1.0.0';
