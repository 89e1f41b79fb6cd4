import { ConfigurationError } from "~/services/config.server";

interface Command {
  usage: string;
  does: string;
  /** @returns the exit code */
  run: (args: string[]) => Promise<number>;
}

/** Each part is loaded when it is asked for: reading a file needs no database, and a database no engine. */
const COMMANDS: Record<string, Command> = {
  checks: {
    usage: "checks FILE…",
    does: "run every case of the check files through the engine",
    run: async (args) => (await import("./commands/checks")).checks(args),
  },
  read: {
    usage: "read FILE [--kind series|cast|track|shape] [--zone ZONE] [--at LAT,LON]",
    does: "read a data file as an upload would; JSON",
    run: async (args) => (await import("./commands/read")).read(args),
  },
  estimate: {
    usage: "estimate SCENARIO.json",
    does: "compute a response; JSON",
    run: async (args) => (await import("./commands/estimate")).estimateCommand(args),
  },
  migrate: {
    usage: "migrate",
    does: "bring the database to this version's form",
    run: async (args) => (await import("./commands/migrate")).migrateCommand(args),
  },
  seed: {
    usage: "seed",
    does: "add the demonstration organisation, its people and its project",
    run: async (args) => (await import("./commands/seed")).seedCommand(args),
  },
  mails: {
    usage: "mails FOLDER",
    does: "write every mail that the product sends, with sample facts, as text and HTML files",
    run: async (args) => (await import("./commands/mails")).mailsCommand(args),
  },
  backup: {
    usage: "backup FILE",
    does: "write a verified copy of the database, also while the server runs",
    run: async (args) => (await import("./commands/backup")).backupCommand(args),
  },
  restore: {
    usage: "restore FILE",
    does: "put a backup in the place of the database's content; what stood there is kept in a file beside it",
    run: async (args) => (await import("./commands/backup")).restoreCommand(args),
  },
  "verify-backup": {
    usage: "verify-backup FILE",
    does: "read a backup through and say what it holds",
    run: async (args) => (await import("./commands/backup")).verifyBackupCommand(args),
  },
};

function help(): string {
  const lines = Object.values(COMMANDS).map(({ usage, does }) => `  ${usage}\n      ${does}`);
  return `Usage: npm run --silent galeprint -- COMMAND\n\n${lines.join("\n")}\n\nSettings come from the environment and from .env; see .env.example.\n`;
}

async function main([name, ...args]: string[]): Promise<number> {
  if (name === undefined || name === "--help" || name === "-h" || name === "help") {
    (name === undefined ? process.stderr : process.stdout).write(help());
    return name === undefined ? 2 : 0;
  }
  const command = Object.hasOwn(COMMANDS, name) ? COMMANDS[name] : undefined;
  if (command === undefined) {
    process.stderr.write(`There is no command "${name}". Commands: ${Object.keys(COMMANDS).join(", ")}.\n`);
    return 2;
  }
  if (args.includes("--help") || args.includes("-h")) {
    process.stdout.write(`Usage: npm run --silent galeprint -- ${command.usage}\n${command.does}\n`);
    return 0;
  }
  try {
    return await command.run(args);
  } catch (error) {
    if (error instanceof ConfigurationError) process.stderr.write(`${error.message}\n`);
    else process.stderr.write(`${name} failed: ${error instanceof Error ? error.message : String(error)}\n`);
    return 1;
  }
}

process.exitCode = await main(process.argv.slice(2));
