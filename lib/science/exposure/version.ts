/** Changes whenever any number of the engine can change. */
export const exposureEngineVersion = '1.0.0'
