import type { ChannelName } from "~/readers/reading";

/** Heat fluxes as figures tell them apart: the net first and solid. */
export const HEAT_PARTS: readonly { channel: ChannelName; label: string; dash: string }[] = [
  { channel: "netHeat", label: "net", dash: "" },
  { channel: "shortwave", label: "shortwave", dash: "8,3,2,3,2,3" },
  { channel: "longwave", label: "longwave", dash: "6,2" },
  { channel: "sensible", label: "sensible", dash: "2,3" },
  { channel: "latent", label: "latent", dash: "6,2,2,2" },
];
