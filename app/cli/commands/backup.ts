import path from "node:path";
import { backUp, BackupError, restoreBackup, verifyBackup, type BackupContents } from "~/db/backup.server";
import { config } from "~/services/config.server";

function described({ bytes, tables, rows, migration }: BackupContents): string {
  return `${(bytes / 1024 / 1024).toFixed(1)} MB, ${tables} tables, ${rows} rows, last migration ${migration}`;
}

/** Runs a command on the one file it names; a known failure is one line, without a stack. */
async function withFile(command: string, args: string[], work: (file: string) => Promise<string>): Promise<number> {
  if (args.length !== 1) {
    process.stderr.write(`${command} takes one file: ${command} FILE\n`);
    return 2;
  }
  try {
    process.stdout.write(`${await work(path.resolve(args[0]))}\n`);
    return 0;
  } catch (error) {
    if (!(error instanceof BackupError)) throw error;
    process.stderr.write(`${error.message}\n`);
    return 1;
  }
}

export function backupCommand(args: string[]): Promise<number> {
  return withFile("backup", args, async (file) => {
    const contents = await backUp(config().databaseFile, file);
    return `Backed up to ${file} (${described(contents)}).`;
  });
}

export function verifyBackupCommand(args: string[]): Promise<number> {
  return withFile("verify-backup", args, async (file) => {
    const contents = await verifyBackup(file);
    return `${file} is a whole backup (${described(contents)}).`;
  });
}

export function restoreCommand(args: string[]): Promise<number> {
  return withFile("restore", args, async (file) => {
    const { databaseFile } = config();
    const moment = new Date().toISOString().replaceAll(":", "-");
    const { kept, ...contents } = await restoreBackup(databaseFile, file, `${databaseFile}.before-restore-${moment}`);
    const former = kept === undefined ? "There was no database before." : `What stood there is kept in ${kept}.`;
    return `Restored ${file} (${described(contents)}). ${former}`;
  });
}
