import { parentPort } from "node:worker_threads";
import bcrypt from "bcryptjs";

// Hashing takes a quarter of a second of one core: here it holds up nobody but itself.
parentPort.on("message", ({ verb, secret, hash, cost }) => {
  const result = verb === "hash" ? bcrypt.hashSync(secret, cost) : bcrypt.compareSync(secret, hash);
  parentPort.postMessage({ result });
});
