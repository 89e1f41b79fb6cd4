/** A mail server for demonstrations and tests: it takes every mail, sends none on, and shows what came. */
import { createServer, type Server } from "node:http";
import PostalMime from "postal-mime";
import { SMTPServer } from "smtp-server";
import { listPage, mailPage } from "./mailbox-pages";

export interface ReceivedMail {
  to: string;
  from: string;
  subject: string;
  text: string;
  html: string;
  receivedAt: Date;
}

export interface Mailbox {
  smtpUrl: string;
  pageUrl: string;
  /** Oldest first. */
  mails: readonly ReceivedMail[];
  /** The first mail to an address, from the `from`th that came; settles when it has come. */
  next(to: string, from?: number): Promise<ReceivedMail>;
  close(): Promise<void>;
}

const HOST = "127.0.0.1";
const MOST_KEPT = 500;

interface Options {
  /** 0: any free port. */
  smtpPort: number;
  port: number;
  host?: string;
}

export async function startMailbox({ smtpPort, port, host = HOST }: Options): Promise<Mailbox> {
  const mails: ReceivedMail[] = [];
  const watchers = new Set<() => void>();
  const smtp = new SMTPServer({
    authOptional: true,
    disabledCommands: ["STARTTLS"],
    logger: false,
    onData(stream, session, done) {
      readMail(stream).then((mail) => {
        const to = session.envelope.rcptTo.map(({ address }) => address).join(", ");
        mails.push({ ...mail, to });
        if (mails.length > MOST_KEPT) mails.shift();
        done();
        for (const look of watchers) look();
      }, done);
    },
  });
  await new Promise<void>((resolve, reject) => {
    smtp.once("error", reject);
    smtp.listen(smtpPort, host, resolve);
  });
  const pages = createServer((request, response) => {
    const [path] = (request.url ?? "/").split("?", 1);
    const found = /^\/mails\/(\d+)$/.exec(path)?.[1];
    const page = found === undefined ? (path === "/" ? listPage(mails) : undefined) : mailPage(mails[Number(found)]);
    response.writeHead(page === undefined ? 404 : 200, {
      "Content-Type": "text/html; charset=utf-8",
      // Mail comes from anyone: its HTML may neither run nor fetch anything.
      "Content-Security-Policy":
        "default-src 'none'; style-src 'unsafe-inline'; frame-src 'self'; sandbox allow-popups allow-top-navigation-by-user-activation",
      "Cache-Control": "no-store",
    });
    response.end(page ?? "There is nothing here.\n");
  });
  await new Promise<void>((resolve, reject) => {
    pages.once("error", reject);
    pages.listen(port, host, resolve);
  });
  return {
    smtpUrl: `smtp://${HOST}:${portOf(smtp.server)}`,
    pageUrl: `http://localhost:${portOf(pages)}`,
    mails,
    next: (to, from = 0) =>
      new Promise((resolve) => {
        const look = () => {
          const mail = mails.find((candidate, index) => index >= from && candidate.to === to);
          if (!mail) return;
          watchers.delete(look);
          resolve(mail);
        };
        watchers.add(look);
        look();
      }),
    close: async () => {
      await new Promise<void>((resolve) => smtp.close(resolve));
      await new Promise<void>((resolve) => {
        pages.close(() => resolve());
        pages.closeAllConnections();
      });
    },
  };
}

async function readMail(stream: AsyncIterable<Buffer>): Promise<Omit<ReceivedMail, "to">> {
  const chunks: Buffer[] = [];
  for await (const chunk of stream) chunks.push(chunk);
  const parsed = await PostalMime.parse(Buffer.concat(chunks));
  return {
    from: parsed.from?.address ?? "",
    subject: parsed.subject ?? "",
    text: parsed.text ?? "",
    html: parsed.html ?? "",
    receivedAt: new Date(),
  };
}

function portOf(server: Pick<Server, "address">): number {
  const address = server.address();
  if (address === null || typeof address === "string") throw new Error("The mailbox listens on no port.");
  return address.port;
}
