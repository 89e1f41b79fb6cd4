import { complex, add, subtract, multiply, divide, exponential, type Complex } from "~/ocean/complex";
import { OceanError } from "~/ocean/errors";

/**
 * Formulas as check files write them in words: numbers, names, + - * / ^, brackets, a blank for multiplication, and
 * sin, cos, exp, sqrt, abs, max, min, of complex numbers. `0.8 exp(i*idx/60)(1+sin(idx/30))/2`.
 */
export type Formula = (variables: Readonly<Record<string, Complex>>) => Complex;

type Token = { kind: "number"; value: number } | { kind: "name"; value: string } | { kind: "sign"; value: string };

const FUNCTIONS: Record<string, (...args: Complex[]) => Complex> = {
  exp: exponential,
  sin: (a) => sine(a),
  cos: (a) => sine({ re: a.re + Math.PI / 2, im: a.im }),
  sqrt: (a) => complex(Math.sqrt(a.re)),
  abs: (a) => complex(Math.hypot(a.re, a.im)),
  max: (...args) => complex(Math.max(...args.map(({ re }) => re))),
  min: (...args) => complex(Math.min(...args.map(({ re }) => re))),
};

function sine(a: Complex): Complex {
  return { re: Math.sin(a.re) * Math.cosh(a.im), im: Math.cos(a.re) * Math.sinh(a.im) };
}

/** @throws OceanError INVALID_INPUT where the text is not such a formula */
export function parseFormula(text: string): Formula {
  const tokens = tokenise(text);
  let at = 0;
  const peek = (): Token | undefined => tokens[at];
  const isSign = (value: string): boolean => peek()?.kind === "sign" && peek()?.value === value;
  const take = (value: string): void => {
    if (!isSign(value)) throw unreadable(text);
    at++;
  };

  const formula = sum();
  if (at < tokens.length) throw unreadable(text);
  return formula;

  function sum(): Formula {
    let left = product();
    while (isSign("+") || isSign("-")) {
      const combine = isSign("+") ? add : subtract;
      at++;
      const [a, b] = [left, product()];
      left = (variables) => combine(a(variables), b(variables));
    }
    return left;
  }

  function product(): Formula {
    let left = signed();
    for (;;) {
      const divided = isSign("/");
      const next = peek();
      const touching = next?.kind === "name" || isSign("(");
      if (!divided && !isSign("*") && !touching) return left;
      if (!touching) at++;
      const [a, b] = [left, signed()];
      left = (variables) => (divided ? divide : multiply)(a(variables), b(variables));
    }
  }

  function signed(): Formula {
    if (!isSign("-")) return power();
    at++;
    const inner = signed();
    return (variables) => subtract(complex(0), inner(variables));
  }

  function power(): Formula {
    const base = atom();
    if (!isSign("^")) return base;
    at++;
    const exponent = signed();
    return (variables) => complex(base(variables).re ** exponent(variables).re);
  }

  function atom(): Formula {
    const token = peek();
    if (token === undefined) throw unreadable(text);
    at++;
    if (token.kind === "number") return () => complex(token.value);
    if (token.kind === "name") return Object.hasOwn(FUNCTIONS, token.value) ? call(token.value) : variable(token.value);
    if (token.value !== "(") throw unreadable(text);
    const inner = sum();
    take(")");
    return inner;
  }

  function call(name: string): Formula {
    take("(");
    const args = [sum()];
    while (isSign(",")) {
      at++;
      args.push(sum());
    }
    take(")");
    return (variables) => FUNCTIONS[name](...args.map((arg) => arg(variables)));
  }

  function variable(name: string): Formula {
    return (variables) => {
      if (!Object.hasOwn(variables, name))
        throw new OceanError("INVALID_INPUT", `"${text}" names "${name}", which is not known here.`);
      return variables[name];
    };
  }
}

function tokenise(text: string): Token[] {
  const tokens: Token[] = [];
  const pattern = /\s*(?:(\d+\.?\d*(?:[eE][+-]?\d+)?|\.\d+(?:[eE][+-]?\d+)?)|([A-Za-z_]\w*)|([-+*/^(),]))/y;
  while (pattern.lastIndex < text.trimEnd().length) {
    const found = pattern.exec(text);
    if (!found) throw unreadable(text);
    if (found[1] !== undefined) tokens.push({ kind: "number", value: Number(found[1]) });
    else if (found[2] !== undefined) tokens.push({ kind: "name", value: found[2] });
    else tokens.push({ kind: "sign", value: found[3] });
  }
  return tokens;
}

function unreadable(text: string): OceanError {
  return new OceanError("INVALID_INPUT", `"${text}" is not a formula that can be read.`);
}
