import type { Route } from "./+types/ledger-csv";
import { ledgerCsv } from "~/estimates/ledger-csv";
import { loadLedger } from "~/estimates/load-ledger.server";
import { currentProject } from "~/projects/current-project.server";
import { fileResponse } from "~/services/file-response.server";

export async function loader({ context, params }: Route.LoaderArgs) {
  const { organisation, tenant, project } = await currentProject(context, params, "project.view");
  const { jobNumber, timeZone: zone } = project;
  const csv = ledgerCsv(await loadLedger(tenant, project), { jobNumber, units: organisation.units, zone });
  return fileResponse(csv, { name: `${jobNumber}-ledger.csv`, type: "text/csv; charset=utf-8" });
}
