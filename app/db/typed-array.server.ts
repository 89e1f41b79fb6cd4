/** Series and results are stored as little-endian float64 blobs beside their unit and length. */

export function toBlob(values: ArrayLike<number>): Buffer {
  const array = values instanceof Float64Array ? values : Float64Array.from(values);
  return Buffer.from(array.buffer, array.byteOffset, array.byteLength);
}

/** A copy, since the driver's buffer need not be aligned to eight bytes. */
export function fromBlob(blob: Buffer, length: number): Float64Array {
  if (blob.byteLength !== length * Float64Array.BYTES_PER_ELEMENT) {
    throw new Error(`A stored series of length ${length} has ${blob.byteLength} bytes.`);
  }
  return new Float64Array(new Uint8Array(blob).buffer);
}
