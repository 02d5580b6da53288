/** The one place that turns numbers into digits. */

const minusSign = "−";
const uncertaintyDigits = 2;
const mostDecimals = 12;

/** A number with a fixed count of decimals and a real minus sign; never "−0". */
export function figure(value: number, decimals: number): string {
  const digits = Math.abs(value).toFixed(decimals);
  return value < 0 && Number(digits) !== 0 ? minusSign + digits : digits;
}

/** A number that always shows its sign, as trim, heel and residuals do. */
export function signedFigure(value: number, decimals: number): string {
  const digits = figure(value, decimals);
  return value > 0 && Number(digits) !== 0 ? `+${digits}` : digits;
}

/**
 * How many decimals a value deserves: those at which its uncertainty has two significant digits.
 *
 *     decimals = 1 − ⌊log₁₀ u⌋, not below 0
 *
 * Source: JCGM 100:2008, 7.2.6 (at most two significant digits of an uncertainty) *from memory*.
 */
export function decimalsFor(uncertainty: number): number {
  if (!(uncertainty > 0) || !Number.isFinite(uncertainty)) return mostDecimals;
  // an uncertainty such as 0.0999 rounds to 0.10: its digits are counted after rounding
  const rounded = Number(uncertainty.toPrecision(uncertaintyDigits));
  const decimals = uncertaintyDigits - 1 - Math.floor(Math.log10(rounded));
  return Math.min(Math.max(decimals, 0), mostDecimals);
}

/** A value with the digits its uncertainty leaves. */
export function figureWithin(value: number, uncertainty: number): string {
  return figure(value, decimalsFor(uncertainty));
}

/** A number with at most so many significant digits, for sentences: no trailing zeros, a real minus sign. */
export function shortFigure(value: number, digits = 6): string {
  const short = String(Math.abs(Number(value.toPrecision(digits))));
  return value < 0 && short !== "0" ? minusSign + short : short;
}
