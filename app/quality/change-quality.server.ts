/** What the forms of the quality page ask for. */
import type { Actor } from "~/context";
import type { Storm } from "~/db/models/storm.server";
import type { Tenant } from "~/db/scoped.server";
import { StormRefusal } from "~/storms/refusal";
import { readFilter } from "./flag-filter";
import { findSamples, namedSamples } from "./find-samples";
import { postedFlag, postedReason } from "./posted-quality";
import { setFlags, takeBackAct } from "./set-flags.server";
import { chooseSuspect, takeOnMissing, withdrawMissing } from "./take-on-missing.server";

interface QualityChange {
  form: FormData;
  /** Of the page's address: the filter that the table showed. */
  search: URLSearchParams;
  actor: Actor;
  zone: string;
}

/** @throws StormRefusal */
export async function changeQuality(
  tenant: Tenant,
  storm: Storm,
  { form, search, actor, zone }: QualityChange,
): Promise<void> {
  switch (form.get("intent")) {
    case "set-flags": {
      const names = form.getAll("sample").map(String);
      const all = form.get("which") === "found";
      await setFlags(tenant, storm, {
        flag: postedFlag(form),
        reason: postedReason(form, "reason"),
        by: actor.id,
        choose({ judged, window, setAt }) {
          if (!all) return namedSamples(judged, names);
          const { filter } = readFilter(search, zone);
          return window ? findSamples(judged, filter, window, (place) => setAt(place) !== null) : [];
        },
      });
      return;
    }
    case "take-back":
      return takeBackAct(tenant, storm, { key: String(form.get("act")), by: actor.id });
    case "take-on-missing":
      return takeOnMissing(tenant, storm, {
        reason: postedReason(form, "missingReason"),
        by: actor.name,
        at: new Date().toISOString(),
      });
    case "withdraw-missing":
      return withdrawMissing(tenant, storm);
    case "suspect":
      return chooseSuspect(tenant, storm, form.get("leaveOutSuspect") === "yes");
    default:
      throw new StormRefusal("This form is not known: open the page again.");
  }
}
