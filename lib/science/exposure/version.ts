/** Changes whenever any number of the engine can change. */
export const exposureEngineVersion = '1.1.0'
