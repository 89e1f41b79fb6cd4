/**
 * `npm test`: prepares the checkout, runs every check of the project, and ends with the sum on a line of its own.
 * A part that cannot run counts as a failure, never as nothing.
 */
import { existsSync, mkdirSync, readFileSync, rmSync } from "node:fs";
import path from "node:path";
import {
  buildIsCurrent,
  findChromium,
  findProgram,
  packagesMatchLock,
  root,
  run,
  stopChildren,
  tail,
} from "./workspace.mjs";

const OUTPUT = path.join(root, "tests/output");
const totals = { passed: 0, failed: 0, skipped: 0 };

function say(line) {
  process.stdout.write(`${line}\n`);
}

function count(name, passed, reason = "") {
  totals[passed ? "passed" : "failed"] += 1;
  say(`${passed ? "passed" : "FAILED"}: ${name}`);
  if (reason) say(reason);
}

/** Something that the tests stand on; counted only when it fails. */
async function prepare(name, command, args, options) {
  say(`${name} …`);
  const { code, output } = await run(command, args, options);
  if (code !== 0) count(name, false, tail(output));
  return code === 0;
}

async function aptInstall(...packages) {
  const apt = findProgram("apt-get");
  if (apt === undefined) return false;
  const asRoot = process.getuid?.() === 0 ? [] : ["sudo", "-n"];
  if (asRoot.length > 0 && findProgram("sudo") === undefined) return false;
  const call = [...asRoot, "env", "DEBIAN_FRONTEND=noninteractive", apt];
  const [program, ...rest] = call;
  await run(program, [...rest, "update", "-qq"]);
  return (await run(program, [...rest, "install", "-y", "-qq", "--no-install-recommends", ...packages])).code === 0;
}

async function ensureChromium() {
  if (findChromium() === undefined) {
    say("Installing Chromium …");
    await aptInstall("chromium");
  }
  const browser = findChromium();
  if (browser === undefined) {
    count(
      "finding Chromium",
      false,
      "Install it (Debian: apt-get install chromium) or set CHROMIUM_PATH to its program.",
    );
  }
  return browser;
}

/** Whether Debian's Python finds a library. */
async function hasPythonLibrary(name) {
  return existsSync("/usr/bin/python3") && (await run("/usr/bin/python3", ["-c", `import ${name}`])).code === 0;
}

/** Tests that read PDFs back, or compare with reference libraries, are skipped with a notice where these are absent. */
async function offerOptionalTools() {
  const missing = [];
  if (findProgram("pdftotext") === undefined) missing.push("poppler-utils");
  if (findProgram("qpdf") === undefined) missing.push("qpdf");
  for (const library of ["gsw", "geographiclib"]) {
    if (!(await hasPythonLibrary(library))) missing.push(`python3-${library}`);
  }
  if (missing.length === 0) return;
  if (!(await aptInstall(...missing))) say(`Not installed: ${missing.join(", ")}; tests that need them are skipped.`);
}

/** Adds up one project of the test runner from its report. */
function countReport(project, reportFile, exitCode) {
  if (!existsSync(reportFile)) {
    count(`${project} tests`, false, "The test runner ended without a report.");
    return;
  }
  const report = JSON.parse(readFileSync(reportFile, "utf8"));
  const cases = report.testResults.flatMap((file) => file.assertionResults);
  const withStatus = (status) => cases.filter((test) => test.status === status).length;
  const failed = withStatus("failed");
  totals.passed += withStatus("passed");
  totals.failed += failed;
  totals.skipped += cases.length - withStatus("passed") - failed;
  const broken = report.testResults.filter(
    (file) => file.status === "failed" && !file.assertionResults.some((test) => test.status === "failed"),
  );
  for (const file of broken)
    count(`${path.relative(root, file.name)} could not run`, false, tail(file.message ?? "", 15));
  if (cases.length === 0) count(`${project} tests`, false, "No test was found.");
  else if (exitCode !== 0 && failed === 0 && broken.length === 0) {
    count(`${project} tests`, false, `The test runner ended with ${exitCode} though no test failed; see above.`);
  }
}

async function runProject(project, env) {
  const reportFile = path.join(OUTPUT, `${project}.json`);
  rmSync(reportFile, { force: true });
  say(`\nTests: ${project}`);
  const { code } = await run(
    process.execPath,
    [
      path.join(root, "node_modules/vitest/vitest.mjs"),
      ...["run", "--project", project, "--reporter=default", "--reporter=json", `--outputFile.json=${reportFile}`],
    ],
    { show: true, env },
  );
  countReport(project, reportFile, code);
}

async function everything() {
  mkdirSync(OUTPUT, { recursive: true });
  if (!packagesMatchLock() && !(await prepare("Installing packages", "npm", ["ci", "--no-audit", "--no-fund"]))) return;
  const chromium = await ensureChromium();
  await offerOptionalTools();
  await prepare("Base map", "npm", ["run", "--silent", "basemap"]);
  for (const check of ["typecheck", "lint"]) {
    const { code, output } = await run("npm", ["run", "--silent", check]);
    count(check, code === 0, code === 0 ? "" : tail(output));
  }
  const built = buildIsCurrent() || (await prepare("Building", "npm", ["run", "build"]));
  await runProject("unit");
  if (built) await runProject("server");
  else count("server tests", false, "They need the build.");
  if (built && chromium !== undefined) await runProject("journeys", { CHROMIUM_PATH: chromium });
  else count("journeys", false, built ? "They need Chromium." : "They need the build.");
}

for (const signal of ["SIGINT", "SIGTERM"]) {
  process.on(signal, () => {
    stopChildren(signal);
    process.exit(130);
  });
}

try {
  await everything();
} catch (error) {
  count("the test run", false, error instanceof Error ? error.stack : String(error));
}
const skipped = totals.skipped > 0 ? `, ${totals.skipped} skipped` : "";
say(`\n${totals.passed} passed, ${totals.failed} failed${skipped}`);
process.exitCode = totals.failed > 0 || totals.passed === 0 ? 1 : 0;
