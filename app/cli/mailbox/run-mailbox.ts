/** `npm run mailbox`: a mail server that keeps what comes and shows it on a page, until Ctrl+C. */
import { parseArgs } from "node:util";
import { startMailbox } from "./mailbox";

const { values } = parseArgs({
  options: {
    "smtp-port": { type: "string", default: "1025" },
    port: { type: "string", default: "8025" },
    host: { type: "string", default: "127.0.0.1" },
  },
});
const mailbox = await startMailbox({
  smtpPort: Number(values["smtp-port"]),
  port: Number(values.port),
  host: values.host,
});
process.stdout.write(`The mailbox shows what comes at ${mailbox.pageUrl}\nIt takes mail at ${mailbox.smtpUrl}\n`);
for (const signal of ["SIGINT", "SIGTERM"] as const) process.once(signal, () => void mailbox.close());
