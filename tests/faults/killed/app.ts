import type { IncomingMessage, ServerResponse } from "node:http";
import { GET } from "../../../app/api/projects/[projectId]/route";
import { PATCH } from "../../../app/api/projects/[projectId]/[part]/[partId]/route";
import { endOnSignal, openServer } from "../../../scripts/serve.mjs";

/** A process to be killed: the product's own server around two of its routes. */
async function handler(incoming: IncomingMessage, outgoing: ServerResponse) {
  const [, , , projectId = "", part = "", partId = ""] = incoming.url!.split("/");
  const chunks: Buffer[] = [];
  for await (const chunk of incoming) chunks.push(chunk as Buffer);
  const headers = Object.entries(incoming.headers).map(([name, value]) => [name, String(value)] as [string, string]);
  const body = incoming.method === "PATCH" ? Buffer.concat(chunks) : undefined;
  const request = new Request(`http://localhost${incoming.url}`, { method: incoming.method, headers, body });
  const answer = part
    ? await PATCH(request, { params: Promise.resolve({ projectId, part, partId }) })
    : await GET(request, { params: Promise.resolve({ projectId }) });
  outgoing.writeHead(answer.status, Object.fromEntries(answer.headers));
  outgoing.end(Buffer.from(await answer.arrayBuffer()));
}

const server = await openServer({ handler, port: Number(process.env.PORT ?? 0), host: "127.0.0.1", origin: "http://localhost", trustedHop: undefined });
endOnSignal(() => server.drain());
process.send?.({ port: server.port });
