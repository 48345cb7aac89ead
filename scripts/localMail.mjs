import { SMTPServer } from "smtp-server";

const most = 100;

/**
 * A mail server for runs on this very machine: it takes every mail and passes none on. What came is kept in memory, where
 * the page /local-inbox of this process reads it; a mail that comes twice is kept once.
 */
export async function openLocalMail() {
  const mails = (globalThis.stillyardInbox ??= []);
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ["STARTTLS", "AUTH"],
    disableReverseLookup: true,
    logger: false,
    closeTimeout: 1_000,
    size: 256 * 1024,
    onData: (stream, session, done) => receive(stream, session).then((mail) => done(null, keep(mails, mail)), done),
  });
  // A client that leaves in the middle is no fault of ours.
  server.on("error", () => {});
  await new Promise((resolve, reject) => server.listen(0, "127.0.0.1", resolve).once("error", reject));
  const { port } = server.server.address();
  return { url: `smtp://127.0.0.1:${port}`, stop: () => new Promise((resolve) => server.close(resolve)) };
}

async function receive(stream, { envelope }) {
  const pieces = [];
  for await (const piece of stream) pieces.push(piece);
  return { to: envelope.rcptTo.map(({ address }) => address).join(", "), ...readMail(Buffer.concat(pieces).toString("utf8")) };
}

function keep(mails, mail) {
  if (mails.some(({ id }) => id === mail.id)) return "kept before";
  mails.unshift(mail);
  mails.length = Math.min(mails.length, most);
  return "kept";
}

/** Subject, text and number of a mail of ours, which are plain text in one piece. */
function readMail(source) {
  const end = source.indexOf("\r\n\r\n");
  const head = source.slice(0, end).replace(/\r\n[ \t]+/g, " ");
  const field = (name) => new RegExp(`^${name}: *(.*)$`, "im").exec(head)?.[1].trim() ?? "";
  const body = source.slice(end + 4);
  const text = field("Content-Transfer-Encoding").toLowerCase() === "quoted-printable" ? readQuoted(body) : body;
  return { id: field("Message-ID"), subject: field("Subject"), text: text.replaceAll("\r\n", "\n").trim(), at: new Date() };
}

function readQuoted(body) {
  const bytes = body.replace(/=\r?\n/g, "").replace(/=([0-9A-F]{2})/gi, (_, pair) => String.fromCharCode(parseInt(pair, 16)));
  return Buffer.from(bytes, "latin1").toString("utf8");
}
