import { setTimeout as sleep } from "node:timers/promises";
import { endOnSignal, openServer } from "../../scripts/serve.mjs";

/** The product's server around a handler that says what arrived: /slow takes a second, /never does not answer, /own has headers of its own. */
async function handler(request, response) {
  if (request.url === "/fault") throw new Error("a fault of the handler");
  if (request.url === "/never") return;
  if (request.url === "/slow") await sleep(1_000);
  if (request.url === "/own") response.setHeader("Content-Security-Policy", "script-src 'self'").setHeader("Cache-Control", "public");
  response.setHeader("Content-Type", "application/json");
  response.end(JSON.stringify({ headers: request.headers, raw: request.rawHeaders }));
}

const { PORT = "0", ORIGIN = "http://localhost", TRUSTED_HOP: trustedHop, ANSWER_WITHIN = "30000" } = process.env;
const server = await openServer({
  handler,
  port: Number(PORT),
  host: "127.0.0.1",
  origin: ORIGIN,
  trustedHop,
  answerWithin: Number(ANSWER_WITHIN),
});
endOnSignal(() => server.drain());
process.send({ port: server.port });
