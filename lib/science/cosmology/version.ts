/** Changes whenever any number of the engine can change. */
export const cosmologyEngineVersion = '1.1.0'
