/** The few operations on complex numbers that the Ekman solutions need. Horizontal vectors are u + i v. */
export interface Complex {
  re: number;
  im: number;
}

export const complex = (re: number, im = 0): Complex => ({ re, im });
export const add = (a: Complex, b: Complex): Complex => ({ re: a.re + b.re, im: a.im + b.im });
export const subtract = (a: Complex, b: Complex): Complex => ({ re: a.re - b.re, im: a.im - b.im });
export const multiply = (a: Complex, b: Complex): Complex => ({
  re: a.re * b.re - a.im * b.im,
  im: a.re * b.im + a.im * b.re,
});
export const scale = (a: Complex, factor: number): Complex => ({ re: a.re * factor, im: a.im * factor });
export const conjugate = (a: Complex): Complex => ({ re: a.re, im: -a.im });
export const modulus = (a: Complex): number => Math.hypot(a.re, a.im);

export function divide(a: Complex, b: Complex): Complex {
  const size = b.re * b.re + b.im * b.im;
  return { re: (a.re * b.re + a.im * b.im) / size, im: (a.im * b.re - a.re * b.im) / size };
}

export function exponential(a: Complex): Complex {
  const size = Math.exp(a.re);
  return { re: size * Math.cos(a.im), im: size * Math.sin(a.im) };
}

/** 1 - e^(-a), without loss of digits for a small a. */
export function decayed(a: Complex): Complex {
  if (modulus(a) > 1e-3) return subtract(complex(1), exponential(scale(a, -1)));
  // a - a²/2 + a³/6 - a⁴/24 + a⁵/120: what is left out is below 1e-17 of it.
  let sum = complex(1);
  for (let n = 5; n >= 2; n--) sum = subtract(complex(1), scale(multiply(a, sum), 1 / n));
  return multiply(a, sum);
}

/** The root with a real part that is not negative. */
export function squareRoot(a: Complex): Complex {
  const size = modulus(a);
  const re = Math.sqrt((size + a.re) / 2);
  const im = Math.sqrt((size - a.re) / 2);
  return { re, im: a.im < 0 ? -im : im };
}
