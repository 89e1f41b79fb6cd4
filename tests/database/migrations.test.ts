import { QueryTypes } from "sequelize";
import { afterAll, expect, test } from "vitest";
import { openOwnDatabase } from "../setup/own-database";

const database = openOwnDatabase();
const { sequelize } = await import("../../app/db/connection.server");
const { migrate, migrateDown, pendingMigrations } = await import("../../app/db/migrate.server");
const { migrations } = await import("../../app/db/migrations/index.server");
const { forOrganisation } = await import("../../app/db/scoped.server");
const { newId } = await import("../../app/db/id.server");

afterAll(() => database.remove());

async function schema(): Promise<string[]> {
  const [rows] = await sequelize.query("SELECT type, name, sql FROM sqlite_master ORDER BY type, name");
  return (rows as { type: string; name: string; sql: string | null }[])
    .filter(({ name }) => name !== "migrations" && !name.startsWith("sqlite_"))
    .map(({ type, name, sql }) => `${type} ${name}: ${sql ?? ""}`);
}

test("migrations run both ways: down leaves nothing, up again makes the same", async () => {
  const before = await schema();
  expect(before.length).toBeGreaterThan(20);
  expect(await migrateDown()).toEqual(migrations.map(({ name }) => name).reverse());
  expect(await schema()).toEqual([]);
  expect(await pendingMigrations()).toEqual(migrations.map(({ name }) => name));
  await migrate();
  expect(await schema()).toEqual(before);
  expect(await migrate()).toEqual([]);
});

test("connections are tuned: write-ahead log, foreign keys, a patient writer", async () => {
  const pragma = async (name: string) => {
    const [row] = await sequelize.query<object>(`PRAGMA ${name}`, { type: QueryTypes.SELECT });
    return Object.values(row)[0];
  };
  expect(await pragma("journal_mode")).toBe("wal");
  expect(await pragma("foreign_keys")).toBe(1);
  expect(await pragma("busy_timeout")).toBe(5000);
});

test("writers at the same time all get through, each seeing what the one before it wrote", async () => {
  await sequelize.query("CREATE TABLE counter (n INTEGER)");
  await sequelize.query("INSERT INTO counter VALUES (0)");
  const { inWriteTransaction } = await import("../../app/db/connection.server");
  const addOne = () =>
    inWriteTransaction(async (transaction) => {
      const [[row]] = (await sequelize.query("SELECT n FROM counter", { transaction })) as unknown as [{ n: number }[]];
      await sequelize.query(`UPDATE counter SET n = ${row.n + 1}`, { transaction });
    });
  await Promise.all(Array.from({ length: 12 }, addOne));
  const [[row]] = (await sequelize.query("SELECT n FROM counter")) as unknown as [{ n: number }[]];
  await sequelize.query("DROP TABLE counter");
  expect(row.n).toBe(12);
});

test("a row of one organisation cannot hang under a row of another", async () => {
  const [a, b] = [newId(), newId()];
  const now = new Date().toISOString();
  await sequelize.query(
    `INSERT INTO users (id, email, name, passwordHash, createdAt, updatedAt) VALUES ('u', 'u@u.example', 'U', 'x', '${now}', '${now}')`,
  );
  for (const id of [a, b]) {
    await sequelize.query(`INSERT INTO organisations VALUES ('${id}', '${id}', 'Org', '{}', 'A4', '${now}', '${now}')`);
  }
  const project = await forOrganisation(a).projects.create({
    name: "P",
    jobNumber: "1",
    client: "C",
    timeZone: "UTC",
    cautionsAcceptedAt: new Date(),
    cautionsAcceptedBy: "u",
  });
  const storm = { projectId: project.id, name: "S", startsAt: null, endsAt: null };
  await expect(forOrganisation(b).storms.create(storm)).rejects.toThrow(/FOREIGN KEY/i);
  expect(await forOrganisation(b).projects.find(project.id)).toBeNull();
  expect(await forOrganisation(b).projects.update(project.id, { name: "Taken" })).toBe(false);
  expect(await forOrganisation(b).projects.remove({ id: project.id })).toBe(0);
  await forOrganisation(a).projects.update(project.id, { organisationId: b } as never);
  expect((await forOrganisation(a).projects.find(project.id))?.name).toBe("P");
});
