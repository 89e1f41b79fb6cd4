import { redirect } from "react-router";
import type { Route } from "./+types/open";
import { exchangeToken, SHARE_HEADERS } from "~/sharing/open-share.server";

export async function loader({ params }: Route.LoaderArgs) {
  const { linkId, cookie } = await exchangeToken(params.token);
  return redirect(`/shared/${linkId}`, { headers: { ...SHARE_HEADERS, "Set-Cookie": cookie } });
}

/** Never seen: the loader sends on or refuses. A component makes the refusal a page. */
export default function OpenShare() {
  return null;
}
