/** Next.js calls this once when a server process starts. */
export async function register(): Promise<void> {
  if (process.env.NEXT_RUNTIME !== 'nodejs') return
  const { start } = await import('./app/_server/start')
  await start()
}
