import sqlite3 from "sqlite3";

type Mode = "read" | "write" | "create";

const FLAGS: Record<Mode, number> = {
  read: sqlite3.OPEN_READONLY,
  write: sqlite3.OPEN_READWRITE,
  create: sqlite3.OPEN_READWRITE | sqlite3.OPEN_CREATE,
};

/** The driver's online backup; it has it, its types do not. */
interface DriverBackup {
  retryErrors: number[];
  step(pages: number, callback: (error: Error | null) => void): void;
  finish(callback: (error: Error | null) => void): void;
}
interface DriverDatabase extends sqlite3.Database {
  backup(
    filename: string,
    destination: string,
    source: string,
    filenameIsDestination: boolean,
    callback: (error: Error | null) => void,
  ): DriverBackup;
}

/** Runs a call that ends in a callback `(error, value)`. */
function settled<T = void>(call: (callback: (error: Error | null, value?: T) => void) => void): Promise<T> {
  return new Promise((resolve, reject) => {
    call((error, value) => (error ? reject(error) : resolve(value as T)));
  });
}

/** One SQLite file opened apart from the application's own connection: for backups, which work below its tables. */
export class SqliteFile {
  private constructor(private readonly database: DriverDatabase) {}

  static async open(file: string, mode: Mode): Promise<SqliteFile> {
    const database = await new Promise<sqlite3.Database>((resolve, reject) => {
      const opened = new sqlite3.Database(file, FLAGS[mode], (error) => (error ? reject(error) : resolve(opened)));
    });
    database.configure("busyTimeout", 5000);
    return new SqliteFile(database as DriverDatabase);
  }

  /** Opens a file for the time of `work`. */
  static async using<T>(file: string, mode: Mode, work: (opened: SqliteFile) => Promise<T>): Promise<T> {
    const opened = await SqliteFile.open(file, mode);
    try {
      return await work(opened);
    } finally {
      await settled((done) => opened.database.close(done));
    }
  }

  run(statement: string, ...values: string[]): Promise<void> {
    return settled((done) => this.database.run(statement, values, (error) => done(error)));
  }

  all<Row>(statement: string): Promise<Row[]> {
    return settled<Row[]>((done) => this.database.all<Row>(statement, done));
  }

  /**
   * Replaces the whole content by that of another file, in one transaction: whoever has this database open sees either
   * the old content or the new one.
   * @param source the file to copy from
   * @param beforeReplacing runs while nobody else can write and the old content still stands
   */
  async replaceContent(source: string, beforeReplacing: () => Promise<void>): Promise<void> {
    let backup: DriverBackup | undefined;
    await settled((done) => {
      backup = this.database.backup(source, "main", "main", false, (error) => done(error));
    });
    if (backup === undefined) throw new Error("The copy could not be prepared.");
    const copy: DriverBackup = backup;
    // A busy database is an error here, not a step to be tried again: the busy timeout has been waited for already.
    copy.retryErrors = [];
    try {
      // No page yet: the first step takes the write lock of this database.
      await settled((done) => copy.step(0, done));
      await beforeReplacing();
      await settled((done) => copy.step(-1, done));
    } finally {
      await settled((done) => copy.finish(done));
    }
  }
}
