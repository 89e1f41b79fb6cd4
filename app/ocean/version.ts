/** Changes whenever a result may change: stored responses are keyed by it. */
export const ENGINE_VERSION = "galeprint-ocean/1.5.0";
