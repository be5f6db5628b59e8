/** Opens the desk once a process, before the first request; a desk that cannot open stops with its reason. */
export async function register(): Promise<void> {
  if (process.env.NEXT_RUNTIME !== 'nodejs') return
  const { startDesk } = await import('./jobs/start-desk')
  await startDesk()
}
