import { answer, type Result, refuse } from "@/lib/result";
import { sum, sumOfProducts } from "./sum";

export type LeastSquares = {
  readonly coefficients: readonly number[];
  /** measured − fitted, in the order of the rows */
  readonly residuals: readonly number[];
  /** (XᵀX)⁻¹: times the variance of one measurement it is the covariance of the coefficients */
  readonly covarianceFactor: readonly (readonly number[])[];
  readonly residualSumOfSquares: number;
  /** rows − columns; 0 where the measurements just suffice */
  readonly degreesOfFreedom: number;
};

export type TooFewRows = { readonly type: "TooFewRows"; readonly got: number; readonly needed: number };
export type RankDeficient = {
  readonly type: "RankDeficient";
  /** first column that the columns before it already determine */
  readonly column: number;
  readonly columns: number;
  /** the part of that column which is its own, of its length 1 */
  readonly independentPart: number;
};

/** Below this own part of a column fewer than four digits of its coefficient would be left of sixteen. */
const leastIndependentPart = 1e-12;

/**
 * The coefficients β that make the sum of squares of y − Xβ least; every row of X is one measurement.
 *
 * Columns are scaled to length 1, X = QR by Householder's reflections, Rβ = Qᵀy, and one correction by the residuals'
 * own fit; normal equations, which lose half the digits, are never formed.
 * Refuses fewer rows than columns, and columns that depend on each other.
 *
 * Source: G. Golub, Numerical methods for solving linear least squares problems, Numer. Math. 7 (1965) 206–216 (from memory).
 */
export function leastSquares(rows: readonly (readonly number[])[], y: readonly number[]): Result<LeastSquares, TooFewRows | RankDeficient> {
  const columns = rows[0]?.length ?? 0;
  if (rows.length !== y.length || rows.some((row) => row.length !== columns)) throw new RangeError("rows of unequal length");
  if (rows.length < columns || columns === 0) return refuse({ type: "TooFewRows", got: rows.length, needed: Math.max(columns, 1) });

  const scale = scaleOfColumns(rows, columns);
  const scaled = rows.map((row) => row.map((value, j) => value / (scale[j] as number)));
  const qr = factorised(scaled, columns);
  const deficient = qr.diagonal.findIndex((value) => !(Math.abs(value) > leastIndependentPart));
  if (deficient >= 0) {
    return refuse({ type: "RankDeficient", column: deficient, columns, independentPart: Math.abs(qr.diagonal[deficient] as number) });
  }

  const first = solved(qr, y);
  const correction = solved(qr, residualsOf(scaled, y, first));
  const refined = first.map((value, j) => value + (correction[j] as number));
  const residuals = residualsOf(scaled, y, refined);
  return answer({
    coefficients: refined.map((value, j) => value / (scale[j] as number)),
    residuals,
    covarianceFactor: inverseOfNormal(qr, scale),
    residualSumOfSquares: sum(residuals.map((r) => r * r)),
    degreesOfFreedom: rows.length - columns,
  });
}

type Factors = {
  /** reflections below and R above the diagonal */
  readonly work: readonly number[][];
  readonly diagonal: readonly number[];
};

function scaleOfColumns(rows: readonly (readonly number[])[], columns: number): number[] {
  return Array.from({ length: columns }, (_, j) => {
    const column = rows.map((row) => row[j] as number);
    return Math.sqrt(sumOfProducts(column, column)) || 1;
  });
}

function residualsOf(rows: readonly (readonly number[])[], y: readonly number[], coefficients: readonly number[]): number[] {
  return rows.map((row, i) => sum([y[i] as number, ...row.map((value, j) => -value * (coefficients[j] as number))]));
}

// work[j] is column j, so that a reflection runs along memory
function factorised(rows: readonly (readonly number[])[], columns: number): Factors {
  const work = Array.from({ length: columns }, (_, j) => rows.map((row) => row[j] as number));
  const diagonal = work.map((column, k) => {
    const length = Math.hypot(...column.slice(k));
    if (length === 0) return 0;
    const head = (column[k] as number) > 0 ? -length : length;
    column[k] = (column[k] as number) - head;
    for (const later of work.slice(k + 1)) reflect(column, later, k);
    return head;
  });
  return { work, diagonal };
}

// target − 2·v(vᵀtarget)/(vᵀv), with v the mirror's normal from row k on
function reflect(normal: readonly number[], target: number[], k: number): void {
  let along = 0;
  let squared = 0;
  for (let i = k; i < target.length; i++) {
    along += (normal[i] as number) * (target[i] as number);
    squared += (normal[i] as number) ** 2;
  }
  const factor = (2 * along) / squared;
  for (let i = k; i < target.length; i++) target[i] = (target[i] as number) - factor * (normal[i] as number);
}

function solved({ work, diagonal }: Factors, y: readonly number[]): number[] {
  const right = [...y];
  work.forEach((normal, k) => {
    reflect(normal, right, k);
  });
  return backSubstituted(work, diagonal, right);
}

function backSubstituted(work: readonly number[][], diagonal: readonly number[], right: readonly number[]): number[] {
  const x = new Array<number>(diagonal.length).fill(0);
  for (let k = diagonal.length - 1; k >= 0; k--) {
    let rest = right[k] as number;
    for (let j = k + 1; j < diagonal.length; j++) rest -= ((work[j] as number[])[k] as number) * (x[j] as number);
    x[k] = rest / (diagonal[k] as number);
  }
  return x;
}

// (XᵀX)⁻¹ = R⁻¹R⁻ᵀ, scales given back
function inverseOfNormal({ work, diagonal }: Factors, scale: readonly number[]): number[][] {
  const unit = diagonal.map((_, k) => diagonal.map((__, j) => (j === k ? 1 : 0)));
  const inverse = unit.map((right) => backSubstituted(work, diagonal, right));
  return scale.map((scaleI, i) =>
    scale.map((scaleJ, j) => sum(inverse.map((column) => (column[i] as number) * (column[j] as number))) / (scaleI * scaleJ)),
  );
}
