/** Interfaces a block. */
const BLOCK = 16;
const BLOCK_BITS = 4;

/**
 * Finds the interface with the least Richardson number of many, block by block: only blocks in which a number has
 * changed are read again. Allocates once a column.
 */
export class LeastInterface {
  /** One number an interface, filled up with infinities to whole blocks. */
  readonly richardson: Float64Array;
  /** The least number beyond the interface last found and its two neighbours: in an array, because so it is not boxed. */
  readonly rival = new Float64Array(1);
  private readonly least: Float64Array;
  private firstStale = 0;
  private lastStale: number;

  constructor(interfaces: number) {
    const blocks = Math.ceil(interfaces / BLOCK);
    this.richardson = new Float64Array(blocks * BLOCK).fill(Number.POSITIVE_INFINITY);
    this.least = new Float64Array(blocks);
    this.lastStale = blocks - 1;
  }

  /** Says that the numbers from…to - 1 have changed since the last `find`. */
  touch(from: number, to: number): void {
    this.firstStale = from >> BLOCK_BITS;
    this.lastStale = (to - 1) >> BLOCK_BITS;
  }

  /** @returns the interface with the least number, the uppermost of equals; `rival` then holds the least of the others */
  find(): number {
    const { richardson, least, rival } = this;
    for (let block = this.firstStale; block <= this.lastStale; block++) {
      least[block] = leastOf(richardson, block * BLOCK, (block + 1) * BLOCK, Number.POSITIVE_INFINITY);
    }
    let found = 0;
    for (let block = 1; block < least.length; block++) if (least[block] < least[found]) found = block;
    let k = found << BLOCK_BITS;
    while (richardson[k] !== least[found]) k++;

    const firstBlock = k > 0 ? (k - 1) >> BLOCK_BITS : 0;
    const lastBlock = Math.min((k + 1) >> BLOCK_BITS, least.length - 1);
    let others = leastOf(least, 0, firstBlock, Number.POSITIVE_INFINITY);
    others = leastOf(least, lastBlock + 1, least.length, others);
    others = leastOf(richardson, firstBlock << BLOCK_BITS, k - 1, others);
    rival[0] = leastOf(richardson, k + 2, (lastBlock + 1) << BLOCK_BITS, others);
    return k;
  }
}

/** The least of numbers from…to - 1 and a bound. */
function leastOf(numbers: Float64Array, from: number, to: number, bound: number): number {
  let least = bound;
  for (let k = from; k < to; k++) if (numbers[k] < least) least = numbers[k];
  return least;
}
