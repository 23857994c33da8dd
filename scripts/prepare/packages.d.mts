/** Whether node_modules in that folder is exactly what its package-lock.json asks for. */
export function installedMatchesLock(folder: string): boolean
/** Runs `npm ci` when node_modules is missing or differs from the lock. */
export function installPackages(): Promise<void>
