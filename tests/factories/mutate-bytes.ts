import { mulberry32 } from "~/ocean/statistics/mulberry32";

const MOST_CHANGES = 8;
const LONGEST_PART = 400;

/**
 * A damaged copy of a file: some bytes set, flipped, lost, repeated or moved in, or its end cut off.
 * @param seed the same seed gives the same damage
 */
export function mutateBytes(good: Uint8Array, seed: number): Uint8Array {
  const random = mulberry32(seed);
  const below = (limit: number): number => Math.floor(random() * limit);
  let bytes = Uint8Array.from(good);
  for (let left = 1 + below(MOST_CHANGES); left > 0 && bytes.length > 0; left -= 1) {
    const at = below(bytes.length);
    const part = 1 + below(LONGEST_PART);
    switch (below(6)) {
      case 0:
        bytes[at] = below(256);
        break;
      case 1:
        bytes[at] ^= 1 << below(8);
        break;
      case 2:
        bytes = join(bytes.subarray(0, at), bytes.subarray(at + part));
        break;
      case 3:
        bytes = join(bytes.subarray(0, at), bytes.subarray(Math.max(0, at - part)));
        break;
      case 4:
        bytes.copyWithin(at, below(bytes.length), below(bytes.length) + part);
        break;
      default:
        if (random() < 0.3) bytes = bytes.slice(0, at);
    }
  }
  return bytes;
}

function join(start: Uint8Array, end: Uint8Array): Uint8Array<ArrayBuffer> {
  const whole = new Uint8Array(start.length + end.length);
  whole.set(start);
  whole.set(end, start.length);
  return whole;
}
