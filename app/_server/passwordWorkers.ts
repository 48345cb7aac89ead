import "server-only";
import { join } from "node:path";
import { Worker } from "node:worker_threads";
import { Refusal } from "./errors";

/** Two hashes at once leave the other requests a core; twenty more may wait, and the next is told so. */
const AT_ONCE = 2;
const QUEUE = 20;

export interface Task {
  verb: "hash" | "compare";
  secret: string;
  hash?: string;
  cost?: number;
}

interface Job {
  task: Task;
  resolve: (result: unknown) => void;
  reject: (fault: Error) => void;
}

interface Seat {
  worker: Worker;
  job: Job | undefined;
}

interface Desk {
  seats: Seat[];
  queue: Job[];
}

declare global {
  var stillyardPasswordDesk: Desk | undefined;
}

/** Pages and routes are separate bundles: they share one desk. */
const desk = () => (globalThis.stillyardPasswordDesk ??= { seats: [], queue: [] });

/** Hands a task to a worker thread and gives its answer. */
export function askWorker(task: Task): Promise<unknown> {
  const { queue } = desk();
  if (queue.length >= QUEUE) {
    return Promise.reject(new Refusal("busy", "Many people are signing in just now. Try again in a moment.", { retryAfter: 5 }));
  }
  return new Promise((resolve, reject) => {
    queue.push({ task, resolve, reject });
    seatNext();
  });
}

function seatNext() {
  const { seats, queue } = desk();
  const seat = seats.find(({ job }) => !job) ?? (seats.length < AT_ONCE && queue.length ? openSeat() : undefined);
  const job = seat && queue.shift();
  if (!seat || !job) return;
  seat.job = job;
  // A waiting job keeps a script alive, an idle worker does not.
  seat.worker.ref();
  seat.worker.postMessage({ ...job.task });
}

function openSeat(): Seat {
  // A plain file beside this one, not part of any bundle.
  const file = join(/* turbopackIgnore: true */ process.cwd(), "app", "_server", "passwordWorker.mjs");
  const seat: Seat = { worker: new Worker(/* turbopackIgnore: true */ file), job: undefined };
  seat.worker.unref();
  seat.worker.on("message", ({ result }: { result: unknown }) => leave(seat)?.resolve(result));
  seat.worker.on("error", (fault) => closeSeat(seat, fault));
  seat.worker.on("exit", () => closeSeat(seat, new Error("The password worker ended.")));
  desk().seats.push(seat);
  return seat;
}

function leave(seat: Seat): Job | undefined {
  const { job } = seat;
  seat.job = undefined;
  seat.worker.unref();
  queueMicrotask(seatNext);
  return job;
}

function closeSeat(seat: Seat, fault: Error) {
  const { seats } = desk();
  if (seats.includes(seat)) seats.splice(seats.indexOf(seat), 1);
  leave(seat)?.reject(fault);
}
