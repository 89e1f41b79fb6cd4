import { readFileSync } from "node:fs";
import { request as httpRequest } from "node:http";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { HttpClient } from "../factories/http";
import { startServer, type RunningServer } from "../setup/run-server";

const GOOD = [
  "time (UTC),wind speed at 10 m (m/s),wind direction from (deg),rain (mm/h)",
  "2026-11-04T00:00Z,5,200,0",
  "2026-11-04T01:00Z,9,210,1",
  "2026-11-04T02:00Z,12,220,2",
  "2026-11-04T03:00Z,7,230,0",
].join("\n");

const MEGABYTE = 1024 * 1024;

let server: RunningServer;
let client: HttpClient;
let storms: string;
let goodStorm: string;
let goodFile: string;

/** A page's words as a person reads them. */
async function wordsOf(response: Response): Promise<string> {
  const html = await response.text();
  const named: Record<string, string> = { "&#x27;": "'", "&quot;": '"', "&amp;": "&", "&lt;": "<", "&gt;": ">" };
  return html
    .replace(/<script[\s\S]*?<\/script>/g, " ")
    .replace(/<!-- -->/g, "")
    .replace(/<[^>]+>/g, " ")
    .replace(/&(?:#x27|quot|amp|lt|gt);/g, (entity) => named[entity])
    .replace(/\s+/g, " ");
}

function upload(to: string, name: string, content: string | Uint8Array<ArrayBuffer>): Promise<Response> {
  const form = new FormData();
  form.set("file", new File([content], name));
  return client.post(to, form);
}

function location(response: Response): string {
  const to = response.headers.get("Location");
  if (response.status !== 302 || !to) throw new Error(`Expected to be sent on, was answered ${response.status}.`);
  return to;
}

beforeAll(async () => {
  server = await startServer();
  client = new HttpClient(server.url);
  const signedUp = await client.post("/sign-up", {
    organisationName: "Thornholm Coastal",
    name: "R. Ansel",
    email: "r.ansel@example.com",
    password: "spring tide over the bar",
  });
  const organisation = location(signedUp);
  const begun = await client.post(`${organisation}/projects/new`, {
    name: "Skarrow Bay intake",
    jobNumber: "2617",
    client: "Skarrow Water Works",
    timeZone: "UTC",
    cautionsAccepted: "on",
  });
  storms = `${location(begun)}/storms`;
  const sheet = location(await upload(`${storms}/new`, "good.csv", GOOD));
  const confirmed = await client.post(sheet, {
    intent: "confirm",
    startsAt: "2026-11-04 00:00",
    endsAt: "2026-11-04 03:00",
  });
  goodStorm = location(confirmed);
  const page = await (await client.get(goodStorm)).text();
  goodFile = /href="([^"]*\/files\/[0-9a-z]+)"/.exec(page)?.[1] ?? "";
});

afterAll(() => server.stop());

/** What was there before is there still, to the byte. */
async function expectNothingLost(): Promise<void> {
  const original = await client.get(goodFile);
  expect(await original.text()).toBe(GOOD);
  const series = await (await client.get(`${goodStorm}/series.csv`)).text();
  expect(series.split("\r\n")[2]).toBe("2026-11-04T01:00:00.000Z,9,210,1");
}

async function stormNames(): Promise<string> {
  return wordsOf(await client.get(storms));
}

describe("a file that cannot be read at all", () => {
  const PNG = new Uint8Array([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a, 0, 0, 0, 13, 0x49, 0x48, 0x44, 0x52]);
  it.each([
    ["empty", "empty.csv", "", /empty\.csv.*is empty.*give it again/i],
    ["an image that is named as text", "photo.csv", PNG, /photo\.csv.*image/i],
    ["one with a header alone", "head.csv", "time (UTC),wind speed (m/s)\n", /Line 1.*no records/i],
    ["one without any column of use", "sweets.csv", "colour,taste\nred,sweet\nblue,sour\n", /sweets\.csv/i],
  ])("(%s) is refused beside the field, and nothing is saved", async (_, name, content, message) => {
    const before = await stormNames();
    const answer = await upload(`${storms}/new`, name, content as string);
    expect(answer.status).toBe(400);
    const words = await wordsOf(answer);
    expect(words).toMatch(message);
    expect(words).toContain("nothing was saved");
    expect(await stormNames()).toBe(before);
    await expectNothingLost();
  });

  it("is refused for a storm that is there, which keeps what it has", async () => {
    const answer = await upload(goodStorm, "empty.csv", "");
    expect(answer.status).toBe(400);
    expect(await wordsOf(answer)).toContain("is empty");
    await expectNothingLost();
  });

  it("is asked for where neither a file nor rows are given, or both are", async () => {
    const nothing = await client.post(`${storms}/new`, new FormData());
    expect(nothing.status).toBe(400);
    expect(await wordsOf(nothing)).toContain("Choose a file, or paste the rows.");
    const both = new FormData();
    both.set("file", new File([GOOD], "a.csv"));
    both.set("pasted", "x");
    const answer = await client.post(`${storms}/new`, both);
    expect(answer.status).toBe(400);
    expect(await wordsOf(answer)).toContain("not both");
  });
});

describe("a file with faults in it", () => {
  const header = "time (UTC),wind speed at 10 m (m/s),wind direction from (deg),rain (mm/h)";
  const rows = (second: string) =>
    [header, "2026-11-05T00:00Z,5,200,0", second, "2026-11-05T02:00Z,7,220,0"].join("\n");

  it.each([
    ["negative rain", rows("2026-11-05T01:00Z,6,210,-4"), /Line 3, column “rain”.*-4.*negative/],
    ["wind of 400 m/s", rows("2026-11-05T01:00Z,400,210,0"), /Line 3, column “wind speed at 10 m”.*400/],
    ["a cell that is no number", rows("2026-11-05T01:00Z,brisk,210,0"), /Line 3, column “wind speed at 10 m”.*brisk/],
    ["a direction of 500", rows("2026-11-05T01:00Z,6,500,0"), /Line 3, column “wind direction from”.*500/],
  ])("(%s) says line and column, and counts for nothing until it is settled", async (_, content, message) => {
    const sheet = location(await upload(`${storms}/new`, "faulty.csv", content));
    const shown = await client.get(sheet);
    expect(shown.status).toBe(200);
    const words = await wordsOf(shown);
    expect(words).toMatch(message);
    expect(words).toMatch(/Leave them out|leave the lines? out/i);

    const window = { startsAt: "2026-11-05 00:00", endsAt: "2026-11-05 02:00" };
    const tooEarly = await client.post(sheet, { intent: "confirm", ...window });
    expect(tooEarly.status).toBe(400);
    expect(await wordsOf(tooEarly)).toContain("Nothing was taken over");
    const storm = sheet.replace(/\/records\/.*/, "");
    expect(await (await client.get(`${storm}/series.csv`)).text()).toBe("time (UTC)\r\n");

    const answered = await client.post(sheet, { intent: "read", leaveOutBadRows: "on" });
    expect(answered.status).toBe(200);
    const confirmed = await client.post(sheet, { intent: "confirm", leaveOutBadRows: "on", ...window });
    expect(location(confirmed)).toBe(storm);
    const lines = (await (await client.get(`${storm}/series.csv`)).text()).trim().split("\r\n");
    expect(lines).toHaveLength(3);
    await expectNothingLost();
  });

  it("(all values missing, written NaN) says which column is empty", async () => {
    const content = rows("2026-11-05T01:00Z,NaN,210,0").replace("Z,5,", "Z,NaN,").replace("Z,7,", "Z,NaN,");
    const sheet = location(await upload(`${storms}/new`, "nan.csv", content));
    expect(await wordsOf(await client.get(sheet))).toMatch(/Column “wind speed at 10 m”: every value is missing/);
  });

  it("(times that go backwards) says where, sorts them and shows it", async () => {
    const content = [header, "2026-11-05T02:00Z,7,220,0", "2026-11-05T00:00Z,5,200,0", "2026-11-05T01:00Z,6,210,0"];
    const sheet = location(await upload(`${storms}/new`, "back.csv", content.join("\n")));
    expect(await wordsOf(await client.get(sheet))).toMatch(/Line 3: times go backwards/);
  });

  it("(a window beyond the record) is refused beside the field, with the record's end", async () => {
    const sheet = location(await upload(`${storms}/new`, "short.csv", GOOD.replaceAll("11-04", "11-09")));
    const answer = await client.post(sheet, {
      intent: "confirm",
      startsAt: "2026-11-09 00:00",
      endsAt: "2026-11-12 00:00",
    });
    expect(answer.status).toBe(400);
    expect(await wordsOf(answer)).toContain("The wind record ends at 2026-11-09 03:00 UTC");
  });

  it("(answers that make no sense) is shown again with what is wrong", async () => {
    const sheet = location(await upload(`${storms}/new`, "odd.csv", GOOD.replaceAll("11-04", "11-10")));
    const answer = await client.post(sheet, { intent: "read", zone: "Atlantis/Central", windHeight: "-3" });
    expect(answer.status).toBe(400);
    const words = await wordsOf(answer);
    expect(words).toContain("Atlantis/Central");
    expect(words).toContain("0.5 to 500 m");
  });
});

describe("more than is taken at once", () => {
  /** Sends `size` bytes as a form until the server answers. */
  function stream(path: string, size: number): Promise<{ status: number; body: string }> {
    return new Promise((resolve, reject) => {
      const cookie = `__Host-galeprint=${client.cookie("__Host-galeprint")}`;
      const sending = httpRequest(new URL(path, server.url), {
        method: "POST",
        headers: {
          Cookie: cookie,
          Origin: server.url,
          "Sec-Fetch-Site": "same-origin",
          "Content-Type": "multipart/form-data; boundary=frontier",
          "Content-Length": size,
        },
      });
      sending.on("response", (response) => {
        let body = "";
        response.setEncoding("utf8").on("data", (part: string) => (body += part));
        response.on("end", () => {
          resolve({ status: response.statusCode ?? 0, body });
          sending.destroy();
        });
      });
      sending.on("error", reject);
      const head = '--frontier\r\nContent-Disposition: form-data; name="file"; filename="year.csv"\r\n\r\n';
      const chunk = Buffer.alloc(MEGABYTE, "2026-11-04T00:00Z,5,200,0\n");
      let left = size - head.length;
      sending.write(head);
      const more = () => {
        while (left > 0 && !sending.destroyed) {
          const part = chunk.subarray(0, Math.min(left, chunk.length));
          left -= part.length;
          if (!sending.write(part)) return sending.once("drain", more);
        }
      };
      more();
    });
  }

  it("is refused at 200 MB with the limit and what to do, and nothing is saved", async () => {
    const before = await stormNames();
    const { status, body } = await stream(`${storms}/new`, 200 * MEGABYTE);
    expect(status).toBe(413);
    expect(body).toContain("64 MB");
    expect(body).toContain("Nothing was saved");
    expect(await stormNames()).toBe(before);
    await expectNothingLost();
  });

  it("is told beside the field before anything is sent", async () => {
    const words = await wordsOf(await client.get(`${storms}/new`));
    expect(words).toContain("up to 64 MB");
  });
});

describe("requests that no page of ours sends", () => {
  it("with a body that is no form are the sender's fault", async () => {
    for (const [type, body] of [
      ["application/json", "{}"],
      ["multipart/form-data", "--x"],
      ["multipart/form-data; boundary=x", "--x\r\nno end"],
    ]) {
      const answer = await fetch(new URL(`${storms}/new`, server.url), {
        method: "POST",
        body,
        headers: {
          "Content-Type": type,
          Cookie: `__Host-galeprint=${client.cookie("__Host-galeprint")}`,
          Origin: server.url,
          "Sec-Fetch-Site": "same-origin",
        },
      });
      expect(answer.status, type).toBe(400);
    }
    await expectNothingLost();
  });

  it("for what is not there are answered 404", async () => {
    for (const path of [`${storms}/nothing`, `${storms}/nothing/series.csv`, `${goodStorm}/records/nothing`]) {
      expect((await client.get(path)).status, path).toBe(404);
    }
    expect((await client.post(goodStorm, { intent: "remove-record", record: "nothing" })).status).toBe(404);
    await expectNothingLost();
  });

  it("carry names that are dangerous elsewhere, which stay names", async () => {
    const name = '../../etc/"passwd"\u0007<script>alert(1)</script>.csv';
    const sheet = location(await upload(`${storms}/new`, name, GOOD.replaceAll("11-04", "11-20")));
    const html = await (await client.get(sheet)).text();
    expect(html).not.toContain("<script>alert(1)");
    const storm = sheet.replace(/\/records\/.*/, "");
    const page = await (await client.get(storm)).text();
    const file = /href="([^"]*\/files\/[0-9a-z]+)"/.exec(page)?.[1] ?? "";
    const download = await client.get(file);
    expect(download.status).toBe(200);
    expect(download.headers.get("Content-Disposition")).toMatch(
      /^attachment; filename="[^"\u0007]*"; filename\*=UTF-8''/,
    );
    expect(download.headers.get("X-Content-Type-Options")).toBe("nosniff");
    expect(download.headers.get("Content-Type")).toBe("application/octet-stream");
  });
});

describe("the sample file on the empty page", () => {
  it("is the invented record of the tests, and can be brought as it is", async () => {
    const sample = await client.get("/samples/invented-storm-buoy.txt");
    expect(sample.status).toBe(200);
    const bytes = new Uint8Array(await sample.arrayBuffer());
    const made = readFileSync(new URL("../factories/files/invented-storm-buoy.txt", import.meta.url));
    expect(Buffer.from(bytes).equals(made)).toBe(true);
    const sheet = location(await upload(`${storms}/new`, "invented-storm-buoy.txt", bytes));
    expect(await wordsOf(await client.get(sheet))).toContain("One question is open");

    // The form posts every control; what stands as the reader put it is no answer, and the provenance keeps its source.
    const answered = await client.post(sheet, { intent: "read", windHeight: "4", directionSense: "from", zone: "" });
    const words = await wordsOf(answered);
    expect(words).toContain("Nothing is open");
    expect(words).toMatch(/Wind height 4 m answered/);
    expect(words).toMatch(/Wind direction where the wind comes from by the format/);
  });
});
