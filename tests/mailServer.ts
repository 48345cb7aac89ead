import { createServer, type Server, type Socket } from "node:net";
import { SMTPServer } from "smtp-server";

export interface Received {
  to: string;
  id: string;
  subject: string;
  text: string;
}

/** A mail server with moods: takes mail, refuses it for now, says nothing at all, or takes it and hangs up before saying so. */
export type Mood = "takes" | "451" | "silent" | "takes, then cuts";

export interface MailServer {
  url: string;
  port: number;
  mood: Mood;
  received: Received[];
  stop: () => Promise<void>;
}

export async function openMailServer(mood: Mood = "takes", port = 0): Promise<MailServer> {
  const received: Received[] = [];
  const sockets = new Set<Socket>();
  const state = { mood };
  const smtp = new SMTPServer({
    authOptional: true,
    disabledCommands: ["STARTTLS", "AUTH"],
    disableReverseLookup: true,
    logger: false,
    closeTimeout: 500,
    onMailFrom: (_address, _session, done) => done(state.mood === "451" ? Object.assign(new Error("later"), { responseCode: 451 }) : null),
    onData(stream, session, done) {
      const pieces: Buffer[] = [];
      stream.on("data", (piece: Buffer) => pieces.push(piece));
      stream.on("end", () => {
        received.push(readMail(Buffer.concat(pieces).toString("utf8"), session.envelope.rcptTo[0]!.address));
        if (state.mood === "takes, then cuts") sockets.forEach((socket) => socket.destroy());
        else done();
      });
    },
  });
  smtp.on("error", () => {});
  const inner = await listen(smtp.listen(0, "127.0.0.1"));
  const front = createServer((socket) => {
    sockets.add(socket.once("close", () => sockets.delete(socket)).on("error", () => {}));
    if (state.mood === "silent") return;
    const behind = new (socket.constructor as typeof Socket)().on("error", () => socket.destroy());
    behind.connect(inner, "127.0.0.1");
    socket.once("close", () => behind.destroy());
    socket.pipe(behind).pipe(socket);
  });
  const open = await listen(front.listen(port, "127.0.0.1"));
  return {
    url: `smtp://127.0.0.1:${open}`,
    port: open,
    received,
    get mood() {
      return state.mood;
    },
    set mood(next: Mood) {
      state.mood = next;
    },
    async stop() {
      sockets.forEach((socket) => socket.destroy());
      await new Promise((resolve) => front.close(resolve));
      await new Promise<void>((resolve) => smtp.close(resolve));
    },
  };
}

async function listen(server: Server): Promise<number> {
  if (!server.listening) await new Promise((resolve) => server.once("listening", resolve));
  return (server.address() as { port: number }).port;
}

function readMail(source: string, to: string): Received {
  const [head = "", ...rest] = source.split("\r\n\r\n");
  const field = (name: string) => new RegExp(`^${name}: *(.*)$`, "im").exec(head)?.[1]?.trim() ?? "";
  const body = rest.join("\r\n\r\n");
  const text = /quoted-printable/i.test(field("Content-Transfer-Encoding")) ? body.replace(/=\r\n/g, "").replace(/=3D/g, "=") : body;
  return { to, id: field("Message-ID"), subject: field("Subject"), text: text.replaceAll("\r\n", "\n") };
}
