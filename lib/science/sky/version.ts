/** Changes whenever any number of the engine can change. */
export const skyEngineVersion = '1.1.0'
