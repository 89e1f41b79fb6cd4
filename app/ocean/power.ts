/** Exponents up to this are multiplied out. */
const MULTIPLIED_OUT = 8;

/**
 * x to the power of y, in the same bits wherever the engine runs. JavaScript leaves the last bit of `**` open, and two
 * versions of one engine differ in it for one argument in ten; products, exp and log agree. Squares may stay `x ** 2`.
 * @param x any number for a whole y from 0 to 8; otherwise ≥ 0
 * @returns within |y ln x| units in the last place or so; NaN where x is negative and y not such a whole number
 */
export function power(x: number, y: number): number {
  if (!Number.isInteger(y) || y < 0 || y > MULTIPLIED_OUT) return Math.exp(y * Math.log(x));
  let product = 1;
  for (let factor = 0; factor < y; factor++) product *= x;
  return product;
}
