/** Called once as the server begins: the jobs that acts leave behind are done from here on. */
export async function register() {
  if (process.env.NEXT_RUNTIME === "nodejs" && process.env.STILLYARD_SMTP) {
    const { startJobs } = await import("./app/_server/jobs/loop");
    startJobs();
  }
}
