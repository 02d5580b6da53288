/**
 * Regularised incomplete beta function I_x(a, b) for a, b > 0 and 0 ≤ x ≤ 1, relative error about 1e-14.
 *
 *     I_x(a, b) = xᵃ(1−x)ᵇ/(a·B(a, b)) · 1/(1+ d₁/(1+ d₂/(1+ …)))
 *
 * `complement` is 1 − x where the caller knows it better than a subtraction gives it.
 * The continued fraction converges fast below x = (a+1)/(a+b+2); above it the symmetry I_x(a,b) = 1 − I_{1−x}(b,a) is used.
 *
 * Source: NIST Digital Library of Mathematical Functions 8.17.22 (from memory).
 */
export function incompleteBeta(x: number, a: number, b: number, complement: number = 1 - x): number {
  if (!(x >= 0 && x <= 1 && a > 0 && b > 0)) throw new RangeError(`incomplete beta of x = ${x}, a = ${a}, b = ${b}`);
  if (x === 0 || complement === 0) return x;
  if (x > (a + 1) / (a + b + 2)) return 1 - incompleteBeta(complement, b, a, x);
  const front = Math.exp(a * Math.log(x) + b * Math.log(complement) - logBeta(a, b)) / a;
  return front * continuedFraction(x, a, b);
}

/** ln Γ(z) for z > 0. Lanczos' approximation, g = 7, nine terms (coefficients by P. Godfrey, from memory); relative error about 1e-15. */
export function logGamma(z: number): number {
  if (z < 0.5) return Math.log(Math.PI / Math.sin(Math.PI * z)) - logGamma(1 - z);
  const shifted = z - 1;
  const series = lanczos.reduce((total, coefficient, i) => (i === 0 ? coefficient : total + coefficient / (shifted + i)), 0);
  const t = shifted + 7.5;
  return 0.5 * Math.log(2 * Math.PI) + (shifted + 0.5) * Math.log(t) - t + Math.log(series);
}

const lanczos = [
  0.99999999999980993, 676.5203681218851, -1259.1392167224028, 771.32342877765313, -176.61502916214059, 12.507343278686905,
  -0.13857109526572012, 9.9843695780195716e-6, 1.5056327351493116e-7,
];

function logBeta(a: number, b: number): number {
  return logGamma(a) + logGamma(b) - logGamma(a + b);
}

// evaluated downwards from a depth at which the rest no longer shows
function continuedFraction(x: number, a: number, b: number): number {
  let value = 1;
  const depth = 60 + Math.ceil(2 * Math.sqrt(Math.max(a, b)));
  for (let k = depth; k >= 1; k--) value = 1 + partialNumerator(k, x, a, b) / value;
  return 1 / value;
}

function partialNumerator(k: number, x: number, a: number, b: number): number {
  const m = Math.floor(k / 2);
  const even = k % 2 === 0;
  const numerator = even ? m * (b - m) * x : -(a + m) * (a + b + m) * x;
  return numerator / ((a + k - 1) * (a + k));
}
