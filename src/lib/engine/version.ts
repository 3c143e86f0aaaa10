/** The version of the calculation, carried by every solution. It changes when a figure may change. */
export const ENGINE_VERSION = '1.1.0';
