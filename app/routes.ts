/** The URL map. What is not on this page is not on the web; the access matrix is generated from it. */
import { index, prefix, route, type RouteConfig } from "@react-router/dev/routes";

export default [
  index("routes/public/landing.tsx"),
  route("verify", "routes/public/verify.tsx"),
  route("methods", "routes/public/methods.tsx"),
  route("basemap/:z/:x/:y", "routes/basemap-tile.ts"),

  route("sign-in", "routes/account/sign-in.tsx"),
  route("sign-up", "routes/account/sign-up.tsx"),
  route("sign-out", "routes/account/sign-out.tsx"),
  route("reset-password", "routes/account/forgot-password.tsx"),
  route("reset-password/:token", "routes/account/reset-password.tsx"),
  route("invitations/:token", "routes/account/invitation.tsx"),

  route("s/:token", "routes/share/open.tsx"),
  route("shared/:link", "routes/share/memo.tsx"),
  route("shared/:link/memo.pdf", "routes/share/pdf.ts"),

  route("o", "routes/org/choose.tsx"),
  route("o/:organisation", "routes/org/layout.tsx", [
    index("routes/org/projects/list.tsx"),
    route("projects/new", "routes/org/projects/new.tsx"),
    route("projects/:project", "routes/org/projects/layout.tsx", [
      index("routes/org/projects/ledger.tsx"),
      route("ledger.csv", "routes/org/projects/ledger-csv.ts"),
      route("facts", "routes/org/projects/edit.tsx"),
      route("thresholds", "routes/org/projects/thresholds.tsx"),

      ...prefix("area", [
        index("routes/org/area/list.tsx"),
        route("new", "routes/org/area/new.tsx"),
        route("import", "routes/org/area/import.tsx"),
        route(":box", "routes/org/area/edit.tsx"),
      ]),

      ...prefix("storms", [
        index("routes/org/storms/list.tsx"),
        route("new", "routes/org/storms/new.tsx"),
        route("tracks/new", "routes/org/storms/new-track.tsx"),
        route(":storm", "routes/org/storms/show.tsx"),
        route(":storm/track", "routes/org/storms/track.tsx"),
        route(":storm/records/:record", "routes/org/storms/reading-sheet.tsx"),
        route(":storm/series.csv", "routes/org/storms/series-csv.ts"),
        route(":storm/quality", "routes/org/storms/quality.tsx"),
        route(":storm/quality/flags.csv", "routes/org/storms/quality-csv.ts"),
      ]),
      route("files/:file", "routes/org/storms/source-file.ts"),

      ...prefix("water", [
        index("routes/org/water/list.tsx"),
        route("new", "routes/org/water/new.tsx"),
        route("casts/new", "routes/org/water/new-cast.tsx"),
        route("casts/:cast", "routes/org/water/cast-sheet.tsx"),
        route(":column", "routes/org/water/edit.tsx"),
      ]),

      ...prefix("estimates", [
        index("routes/org/estimates/list.tsx"),
        route(":estimate", "routes/org/estimates/response.tsx"),
        route(":estimate/response.json", "routes/org/estimates/response-json.ts"),
        route(":estimate/series.csv", "routes/org/estimates/series-csv.ts"),
        route(":estimate/without-suspect", "routes/org/estimates/without-suspect.tsx"),
      ]),

      ...prefix("memos", [
        index("routes/org/memos/list.tsx"),
        route("new", "routes/org/memos/new.tsx"),
        route(":memo", "routes/org/memos/edit.tsx"),
        route(":memo/draft.pdf", "routes/org/memos/draft-pdf.ts"),
        route(":memo/revisions/:revision", "routes/org/memos/revision.tsx"),
        route(":memo/revisions/:revision/memo.pdf", "routes/org/memos/revision-pdf.ts"),
      ]),
    ]),
    route("settings", "routes/org/settings.tsx"),
    ...prefix("members", [
      index("routes/org/members/list.tsx"),
      route("roles", "routes/org/members/roles.tsx"),
      route(":member", "routes/org/members/member.tsx"),
    ]),
    route("method-sheets", "routes/org/method-sheets/list.tsx"),
    route("method-sheets/new", "routes/org/method-sheets/new.tsx"),
  ]),

  route("*", "routes/public/not-found.tsx"),
] satisfies RouteConfig;
