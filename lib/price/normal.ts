/**
 * Inverse of the standard normal distribution: z with Phi(z) = p, for 0 < p < 1.
 * Wichura 1988, algorithm AS 241 (PPND16): relative error about 1e-16. Returns -Infinity, Infinity at 0 and 1, NaN outside.
 */
export function normalQuantile(p: number): number {
  const q = p - 0.5;
  if (Math.abs(q) <= 0.425) {
    const r = 0.180625 - q * q;
    return (q * horner(A, r)) / horner(B, r);
  }
  const tail = q < 0 ? p : 1 - p;
  if (!(tail > 0)) return tail === 0 ? (q < 0 ? -Infinity : Infinity) : NaN;
  const r = Math.sqrt(-Math.log(tail));
  const z = r <= 5 ? horner(C, r - 1.6) / horner(D, r - 1.6) : horner(E, r - 5) / horner(F, r - 5);
  return q < 0 ? -z : z;
}

/**
 * Standard normal distribution function Phi(x).
 * Series of Marsaglia 2004 (J. Stat. Softw. 11(4)): Phi = 1/2 + phi(x) (x + x^3/3 + x^5/15 + ...), error below 1e-14
 * for |x| < 8; 0 or 1 beyond.
 */
export function normalCdf(x: number): number {
  if (x <= -8) return 0;
  if (x >= 8) return 1;
  let term = x;
  let sum = x;
  for (let k = 3; Math.abs(term) > 1e-17 * Math.abs(sum); k += 2) {
    term *= (x * x) / k;
    sum += term;
  }
  return 0.5 + sum * Math.exp(-0.5 * x * x - halfLog2Pi);
}

const halfLog2Pi = 0.9189385332046727;

function horner(c: readonly number[], x: number): number {
  let value = 0;
  for (let i = c.length - 1; i >= 0; i--) value = value * x + c[i]!;
  return value;
}

// Coefficients of AS 241, lowest power first.
const A = [
  3.387132872796366608, 133.14166789178437745, 1971.5909503065514427, 13731.693765509461125,
  45921.953931549871457, 67265.770927008700853, 33430.575583588128105, 2509.0809287301226727,
];
const B = [
  1, 42.313330701600911252, 687.1870074920579083, 5394.1960214247511077, 21213.794301586595867,
  39307.89580009271061, 28729.085735721942674, 5226.495278852854561,
];
const C = [
  1.42343711074968357734, 4.6303378461565452959, 5.7694972214606914055, 3.64784832476320460504,
  1.27045825245236838258, 0.24178072517745061177, 0.0227238449892691845833, 7.7454501427834140764e-4,
];
const D = [
  1, 2.05319162663775882187, 1.6763848301838038494, 0.68976733498510000455, 0.14810397642748007459,
  0.0151986665636164571966, 5.475938084995344946e-4, 1.05075007164441684324e-9,
];
const E = [
  6.6579046435011037772, 5.4637849111641143699, 1.7848265399172913358, 0.29656057182850489123,
  0.026532189526576123093, 0.0012426609473880784386, 2.71155556874348757815e-5, 2.01033439929228813265e-7,
];
const F = [
  1, 0.59983220655588793769, 0.13692988092273580531, 0.0148753612908506148525, 7.868691311456132591e-4,
  1.8463183175100546818e-5, 1.4215117583164458887e-7, 2.04426310338993978564e-15,
];
