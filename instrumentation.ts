/** Starts the scheduled work with the server: letters go out from the process that serves. */
export async function register(): Promise<void> {
  if (process.env.NEXT_RUNTIME !== 'nodejs') return
  const { startJobs } = await import('./lib/jobs/startJobs')
  startJobs()
}
