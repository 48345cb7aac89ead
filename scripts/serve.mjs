import { createServer, STATUS_CODES } from "node:http";
import { pathToFileURL } from "node:url";
import { isLoopback, isTrustworthy, sealedPolicy, securityHeaders, strictTransport } from "./headers.mjs";
import { root } from "./places.mjs";
import { routerStateReader } from "./routerState.mjs";
import { Sentence, tellFault } from "./sentence.mjs";

const longestAddress = 2048;
const addressHeader = "x-stillyard-address";

/** What only we, or a hop we trust, may say about a request; and the framework's private headers. */
const forbidden = /^(x-forwarded-.*|forwarded|x-real-ip|x-stillyard-address|x-middleware-.*)$/i;

const words = {
  400: "This request could not be read.",
  405: "This cannot be asked here.",
  408: "This request took too long to arrive.",
  414: "This address is too long.",
  431: "The headers of this request are too long.",
  500: "Something went wrong on our side.",
  503: "The answer took too long. Nothing was lost that was confirmed; try again.",
};

/** What an answer carries where whoever wrote it said nothing of its own: a redirect or a fault of the framework. */
const otherwise = { "Content-Security-Policy": sealedPolicy, "Cache-Control": "private, no-store" };

const methods = new Set(["GET", "HEAD", "POST", "PUT", "PATCH", "DELETE", "OPTIONS"]);

/**
 * Opens the product's http server around a handler: sizes, times, the client's address, an orderly end.
 * `trustedHop` is the address of a forwarding server whose last word on the client's address is believed.
 * Only a server under development has use for `upgrades`, sockets that become channels of their own. `reads` tells
 * whether the handler can read the headers of a request.
 */
export async function openServer({ handler, port, host, origin, trustedHop, answerWithin = 30_000, upgrades = false, reads = () => true }) {
  const always = { ...securityHeaders, ...(isTrustworthy(origin) ? { "Strict-Transport-Security": strictTransport } : {}) };
  const limits = { maxHeaderSize: 16_384, headersTimeout: 10_000, requestTimeout: 30_000, connectionsCheckingInterval: 1_000 };
  const server = createServer({ ...limits, keepAliveTimeout: 5_000 }, async (request, response) => {
    for (const [name, value] of Object.entries(always)) response.setHeader(name, value);
    fillIn(response);
    const refused = refusalOf(request) ?? (reads(request.headers) ? undefined : 400);
    if (refused) return refuse(response, refused);
    nameTheClient(request, trustedHop);
    const late = setTimeout(() => response.headersSent || refuse(response, 503), answerWithin);
    response.once("close", () => clearTimeout(late));
    try {
      await handler(request, response);
    } catch (fault) {
      console.error(fault);
      refuse(response, 500);
    }
  });
  server.on("clientError", (fault, socket) => refuseRaw(socket, statusOf(fault), always));
  const drain = prepareDrain(server);
  server.on("upgrade", (_request, socket) => (upgrades ? endWithDrain(server, socket) : refuseRaw(socket, 400, always)));
  await listen(server, port, host);
  return { port: server.address().port, drain };
}

function listen(server, port, host) {
  return new Promise((resolve, reject) => {
    server.once("error", (fault) => reject(fault.code === "EADDRINUSE" ? portTaken(port) : fault));
    server.listen(port, host, resolve);
  });
}

export function portTaken(port) {
  return new Sentence(`Port ${port} is taken by another program: free it, or choose another with PORT=3001 npm start.`);
}

/** Adds at the last moment what an answer must not be without. */
function fillIn(response) {
  const { writeHead } = response;
  response.writeHead = (...head) => {
    for (const [name, value] of Object.entries(otherwise)) if (!response.hasHeader(name)) response.setHeader(name, value);
    return writeHead.apply(response, head);
  };
}

/** The status of a request that nobody behind us has to read, or undefined. */
function refusalOf({ method, url }) {
  if (url.length > longestAddress) return 414;
  if (!methods.has(method)) return 405;
  // A path of our own, whole: a server's name before it would come back in redirects.
  return url.startsWith("/") && isReadable(url) ? undefined : 400;
}

function isReadable(url) {
  try {
    return decodeURIComponent(url.split("?")[0]) !== "";
  } catch {
    return false;
  }
}

/** Removes all that a client says about its own address and writes down what the socket says. */
function nameTheClient(request, trustedHop) {
  const socketAddress = request.socket.remoteAddress ?? "";
  const forwarded = request.headers["x-forwarded-for"]?.split(",").at(-1)?.trim();
  for (const name of Object.keys(request.headers)) if (forbidden.test(name)) delete request.headers[name];
  request.rawHeaders = pairs(request.rawHeaders).filter(([name]) => !forbidden.test(name)).flat();
  const address = trustedHop && socketAddress === trustedHop && forwarded ? forwarded : socketAddress;
  request.headers[addressHeader] = address;
  request.rawHeaders.push(addressHeader, address);
}

function pairs(flat) {
  return Array.from({ length: flat.length / 2 }, (_, index) => flat.slice(2 * index, 2 * index + 2));
}

function refuse(response, status) {
  if (response.headersSent) return response.destroy();
  response.writeHead(status, { "Content-Type": "text/plain; charset=utf-8", ...otherwise, Connection: "close" });
  response.end(`${words[status]}\n`);
}

/** The parser gave up before there was a request: the answer is written by hand. */
function refuseRaw(socket, status, always) {
  if (!socket.writable) return socket.destroy();
  const body = `${words[status]}\n`;
  const headers = {
    ...always,
    ...otherwise,
    "Content-Type": "text/plain; charset=utf-8",
    "Content-Length": Buffer.byteLength(body),
    Connection: "close",
  };
  const lines = Object.entries(headers).map(([name, value]) => `${name}: ${value}\r\n`);
  // The other side may never close its half.
  setTimeout(() => socket.destroy(), 1_000).unref();
  socket.end(`HTTP/1.1 ${status} ${STATUS_CODES[status]}\r\n${lines.join("")}\r\n${body}`);
}

function statusOf({ code }) {
  if (code === "HPE_HEADER_OVERFLOW") return 431;
  return code === "ERR_HTTP_REQUEST_TIMEOUT" ? 408 : 400;
}

/** A socket that became a channel of its own would keep the server open for ever. */
function endWithDrain(server, socket) {
  server.once("drain-begins", () => socket.destroy());
}

/** Ends without cutting answers: no new connections, open requests have their time, then all is closed. */
function prepareDrain(server) {
  const sockets = new Set();
  server.on("connection", (socket) => sockets.add(socket.once("close", () => sockets.delete(socket))));
  let draining = false;
  server.on("request", (_request, response) => {
    response.once("finish", () => draining && setImmediate(() => server.closeIdleConnections()));
  });
  return async function drain(within = 20_000) {
    draining = true;
    const closed = new Promise((resolve) => server.close(resolve));
    server.emit("drain-begins");
    server.closeIdleConnections();
    const late = setTimeout(() => sockets.forEach((socket) => socket.destroy()), within);
    await closed;
    clearTimeout(late);
  };
}

/**
 * Serves the product itself from this process. The environment must be complete.
 * The door opens only when `ready` has come: the framework wakes up meanwhile.
 */
export async function serveProduct({ developing = false, ready } = {}) {
  process.env.NODE_ENV = developing ? "development" : "production";
  process.chdir(root);
  const { default: next } = await import("next");
  const port = Number(process.env.PORT);
  const origin = process.env.STILLYARD_ORIGIN;
  const mail = await namePostOffice(origin);
  const app = next({ dev: developing, dir: root, hostname: "localhost", port });
  await Promise.all([app.prepare(), ready]);
  const server = await openServer({
    handler: app.getRequestHandler(),
    port,
    host: process.env.STILLYARD_HOST ?? (isLoopback(origin) ? "127.0.0.1" : undefined),
    origin,
    trustedHop: process.env.STILLYARD_TRUSTED_HOP,
    // A page may have to be compiled first.
    answerWithin: developing ? 180_000 : undefined,
    upgrades: developing,
    reads: await routerStateReader(),
  });
  const stop = async () => {
    await server.drain();
    // Started by the framework as it woke up: the job in hand ends or is handed back.
    await globalThis.stillyardJobs?.stop();
    await app.close();
    await mail?.stop();
  };
  return { stop, inbox: mail && `${origin}/local-inbox` };
}

/** Where no mail server is named and nobody else can open the product, it has one of its own. */
async function namePostOffice(origin) {
  if (process.env.STILLYARD_SMTP || !isLoopback(origin)) return undefined;
  const { openLocalMail } = await import("./localMail.mjs");
  const mail = await openLocalMail();
  process.env.STILLYARD_SMTP = mail.url;
  return mail;
}

/** Ends the process in order on the first signal. A terminal and npm may both pass the same one on: repeats are ignored. */
export function endOnSignal(end) {
  let ending = false;
  const begin = async (code) => {
    if (ending) return;
    ending = true;
    try {
      await end();
      process.exit(typeof code === "number" ? code : 0);
    } catch (fault) {
      tellFault(fault);
      process.exit(1);
    }
  };
  for (const signal of ["SIGINT", "SIGTERM", "SIGHUP"]) process.on(signal, begin);
  if (process.env.npm_lifecycle_event) endWithParent(begin);
  return begin;
}

/** npm killed outright passes no signal on: without it nobody would end us. */
function endWithParent(begin) {
  const parent = process.ppid;
  setInterval(() => process.ppid !== parent && begin(), 1_000).unref();
}

if (import.meta.url === pathToFileURL(process.argv[1] ?? "").href) {
  const product = serveProduct();
  const end = endOnSignal(async () => (await product).stop());
  // Started by a runner: when the runner is gone, nobody else would end us.
  process.on("disconnect", end);
  product.then(
    () => process.send?.("serving"),
    (fault) => (tellFault(fault), process.exit(1)),
  );
}
