/** What becomes of the estimates on a water column, in sentences. */
const MOST_NAMED = 12;

function shorten(codes: readonly string[]): string {
  const named = codes.slice(0, MOST_NAMED).join(", ");
  return codes.length > MOST_NAMED ? `${named} and ${codes.length - MOST_NAMED} more` : named;
}

/** @param codes of at least one estimate */
export function whatGetsOld(codes: readonly string[]): string {
  const [uses, becomes] =
    codes.length === 1 ? ["One estimate uses", "becomes"] : [`${codes.length} estimates use`, "become"];
  return `${uses} this column and ${becomes} out of date when its numbers change: ${shorten(codes)}.`;
}

export function whatGoes(codes: readonly string[]): string {
  const estimates =
    codes.length === 0
      ? "No estimate uses it."
      : `The ${codes.length === 1 ? "estimate" : "estimates"} on it ${codes.length === 1 ? "goes" : "go"} too: ${shorten(codes)}. Issued memos keep what they say.`;
  return `${estimates} This cannot be taken back.`;
}
