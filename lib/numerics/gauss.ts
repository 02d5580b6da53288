export type GaussRule = { readonly nodes: readonly number[]; readonly weights: readonly number[] };

/**
 * Gauss–Legendre rule on the interval 0 to 1: ∫f ≈ Σ weightᵢ·f(nodeᵢ), exact for polynomials of degree 2·count − 1.
 * Nodes ascend and lie symmetrically about ½.
 *
 * Source: Abramowitz & Stegun, Handbook of Mathematical Functions, 25.4.29 (from memory); checked against its table 25.4.
 */
export function gaussLegendre(count: number): GaussRule {
  if (!Number.isInteger(count) || count < 1) throw new RangeError(`Gauss rule of ${count} points`);
  const nodes = new Array<number>(count);
  const weights = new Array<number>(count);
  for (let i = 0; 2 * i < count; i++) {
    const { root, derivative } = legendreRoot(count, i);
    const weight = 1 / ((1 - root ** 2) * derivative ** 2);
    nodes[i] = (1 - root) / 2;
    nodes[count - 1 - i] = (1 + root) / 2;
    weights[i] = weight;
    weights[count - 1 - i] = weight;
  }
  return { nodes, weights };
}

function legendreRoot(degree: number, i: number): { root: number; derivative: number } {
  if (2 * i + 1 === degree) return { root: 0, derivative: legendre(degree, 0).derivative };
  let root = Math.cos((Math.PI * (i + 0.75)) / (degree + 0.5));
  for (let step = 0; step < 8; step++) {
    const { value, derivative } = legendre(degree, root);
    root -= value / derivative;
  }
  return { root, derivative: legendre(degree, root).derivative };
}

function legendre(degree: number, x: number): { value: number; derivative: number } {
  let before = 1;
  let value = x;
  for (let n = 2; n <= degree; n++) [before, value] = [value, ((2 * n - 1) * x * value - (n - 1) * before) / n];
  return { value, derivative: (degree * (before - x * value)) / (1 - x ** 2) };
}
