import type { Action } from "../../app/organisations/permissions";

/**
 * Who may ask what of each route. `public`: anyone; `signedIn`: anyone with an account; an action: members whose role
 * may do it; null: the route has no such method.
 */
export interface Rule {
  get: "public" | "signedIn" | Action | null;
  post: "public" | "signedIn" | Action | null;
  /** Answers something else than a page: there is no `.data` request. */
  resource?: true;
}

export const RULES: Record<string, Rule> = {
  "routes/public/landing.tsx": { get: "public", post: null },
  "routes/public/verify.tsx": { get: "public", post: null },
  "routes/public/methods.tsx": { get: "public", post: null },
  "routes/public/not-found.tsx": { get: "public", post: "public" },
  "routes/basemap-tile.ts": { get: "public", post: null, resource: true },
  "routes/account/sign-in.tsx": { get: "public", post: "public" },
  "routes/account/sign-up.tsx": { get: "public", post: "public" },
  "routes/account/sign-out.tsx": { get: "public", post: "public", resource: true },
  "routes/account/forgot-password.tsx": { get: "public", post: "public" },
  "routes/account/reset-password.tsx": { get: "public", post: "public" },
  "routes/account/invitation.tsx": { get: "public", post: "public" },
  "routes/share/open.tsx": { get: "public", post: null },
  "routes/share/memo.tsx": { get: "public", post: null },
  "routes/share/pdf.ts": { get: "public", post: null, resource: true },
  "routes/org/choose.tsx": { get: "signedIn", post: null },
  "routes/org/layout.tsx": { get: "project.view", post: null },
  "routes/org/projects/list.tsx": { get: "project.view", post: null },
  "routes/org/projects/new.tsx": { get: "project.edit", post: "project.edit" },
  "routes/org/projects/layout.tsx": { get: "project.view", post: null },
  "routes/org/projects/ledger.tsx": { get: "project.view", post: "estimate.run" },
  "routes/org/projects/ledger-csv.ts": { get: "project.view", post: null, resource: true },
  "routes/org/projects/edit.tsx": { get: "project.edit", post: "project.edit" },
  "routes/org/projects/thresholds.tsx": { get: "project.view", post: "project.edit" },
  "routes/org/area/list.tsx": { get: "project.view", post: null },
  "routes/org/area/new.tsx": { get: "project.edit", post: "project.edit" },
  "routes/org/area/import.tsx": { get: "project.edit", post: "project.edit" },
  "routes/org/area/edit.tsx": { get: "project.edit", post: "project.edit" },
  "routes/org/storms/list.tsx": { get: "project.view", post: null },
  "routes/org/storms/new.tsx": { get: "project.edit", post: "project.edit" },
  "routes/org/storms/new-track.tsx": { get: "project.edit", post: "project.edit" },
  "routes/org/storms/track.tsx": { get: "project.edit", post: "project.edit" },
  "routes/org/storms/show.tsx": { get: "project.view", post: "project.edit" },
  "routes/org/storms/reading-sheet.tsx": { get: "project.edit", post: "project.edit" },
  "routes/org/storms/series-csv.ts": { get: "project.view", post: null, resource: true },
  "routes/org/storms/quality.tsx": { get: "project.view", post: "project.edit" },
  "routes/org/storms/quality-csv.ts": { get: "project.view", post: null, resource: true },
  "routes/org/storms/source-file.ts": { get: "project.view", post: null, resource: true },
  "routes/org/water/list.tsx": { get: "project.view", post: null },
  "routes/org/water/new.tsx": { get: "project.edit", post: "project.edit" },
  "routes/org/water/new-cast.tsx": { get: "project.edit", post: "project.edit" },
  "routes/org/water/cast-sheet.tsx": { get: "project.edit", post: "project.edit" },
  "routes/org/water/edit.tsx": { get: "project.edit", post: "project.edit" },
  "routes/org/estimates/list.tsx": { get: "project.view", post: null },
  "routes/org/estimates/response.tsx": { get: "project.view", post: "estimate.run" },
  "routes/org/estimates/response-json.ts": { get: "project.view", post: null, resource: true },
  "routes/org/estimates/series-csv.ts": { get: "project.view", post: null, resource: true },
  "routes/org/estimates/without-suspect.tsx": { get: "project.view", post: null },
  "routes/org/memos/list.tsx": { get: "project.view", post: null },
  "routes/org/memos/new.tsx": { get: "memo.write", post: "memo.write" },
  "routes/org/memos/edit.tsx": { get: "project.view", post: "memo.write" },
  "routes/org/memos/draft-pdf.ts": { get: "project.view", post: null, resource: true },
  "routes/org/memos/revision.tsx": { get: "project.view", post: "memo.share" },
  "routes/org/memos/revision-pdf.ts": { get: "project.view", post: null, resource: true },
  "routes/org/settings.tsx": { get: "organisation.manage", post: "organisation.manage" },
  "routes/org/members/list.tsx": { get: "project.view", post: "member.manage" },
  "routes/org/members/roles.tsx": { get: "project.view", post: null },
  "routes/org/members/member.tsx": { get: "member.manage", post: "member.manage" },
  "routes/org/method-sheets/list.tsx": { get: "project.view", post: null },
  "routes/org/method-sheets/new.tsx": { get: "project.edit", post: "project.edit" },
};
