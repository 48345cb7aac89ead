import "server-only";
import { log } from "../log";
import { jobKinds } from "./kinds";
import { claimJob, failJob, finishJob, handBack, MOST_TRIES, renewLease, type Claimed } from "./queue";
import { sweep } from "./sweep";

const LOOK_EVERY = 5_000;
const RENEW_EVERY = 20_000;
const SWEEP_EVERY = 3_600_000;
/** What a job in hand gets to come to its end when the process ends. */
const END_WITHIN = 5_000;

interface Jobs {
  wake: () => void;
  stop: () => Promise<void>;
}

declare global {
  var stillyardJobs: Jobs | undefined;
}

/** Does one job that is due; false where there was none. Safe to run in many processes at once. */
export async function runNextJob(signal?: AbortSignal): Promise<boolean> {
  const job = await claimJob();
  if (!job) return false;
  const renewing = setInterval(() => void renewLease(job).catch(() => undefined), RENEW_EVERY);
  try {
    await Promise.race([doJob(job), givenUp(signal)]);
  } catch (thrown) {
    if (!(thrown instanceof GivenUp)) throw thrown;
    await handBack(job);
  } finally {
    clearInterval(renewing);
  }
  return true;
}

async function doJob(job: Claimed) {
  try {
    // A job whose every try took its process with it is not tried for ever.
    if (job.tries > MOST_TRIES) throw new Error("Each try ended with its process.");
    const work = jobKinds[job.kind];
    if (!work) throw new Error(`There is no kind of job called ${job.kind}.`);
    await work(job);
    await finishJob(job);
  } catch (thrown) {
    const state = await failJob(job, thrown instanceof Error ? thrown.message : "unknown");
    log[state === "dead" ? "error" : "warn"]({ err: thrown, job: job.id, kind: job.kind, tries: job.tries }, `a job is ${state}`);
  }
}

class GivenUp extends Error {}

function givenUp(signal: AbortSignal | undefined): Promise<never> {
  return new Promise((_, reject) => signal?.addEventListener("abort", () => reject(new GivenUp())));
}

/** Starts this process's loop, once. `stop` lets the job in hand end, or hands it back. */
export function startJobs(): void {
  globalThis.stillyardJobs ??= openLoop();
}

function openLoop(): Jobs {
  const giveUp = new AbortController();
  const state = { stopping: false, sweptAt: 0 };
  let rouse = () => {};
  const rest = () =>
    new Promise<void>((resolve) => {
      const timer = setTimeout(resolve, LOOK_EVERY);
      rouse = () => (clearTimeout(timer), resolve());
    });
  let roused = false;
  async function go() {
    while (!state.stopping) {
      roused = false;
      const found = await lookOnce(giveUp.signal, state).catch(tell);
      if (!found && !roused && !state.stopping) await rest();
    }
  }
  const gone = go();
  return {
    wake: () => ((roused = true), rouse()),
    async stop() {
      state.stopping = true;
      rouse();
      const late = setTimeout(() => giveUp.abort(), END_WITHIN);
      await gone;
      clearTimeout(late);
    },
  };
}

async function lookOnce(signal: AbortSignal, state: { sweptAt: number }): Promise<boolean> {
  if (performance.now() - state.sweptAt > SWEEP_EVERY || state.sweptAt === 0) {
    state.sweptAt = performance.now();
    await sweep();
  }
  return runNextJob(signal);
}

/** A database that cannot be reached just now is asked again after a rest. */
function tell(thrown: unknown): false {
  log.warn({ err: thrown }, "the jobs could not be looked at");
  return false;
}
