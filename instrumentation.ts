/** Runs once when a server process starts, before the first request. */
export async function register(): Promise<void> {
  if (process.env.NEXT_RUNTIME !== "nodejs") return;
  const { startUp } = await import("./lib/startup");
  await startUp();
}
