/** How many digits two numbers share: −log₁₀ of their relative difference, at most 16. */
export function agreeingDigits(found: number, certified: number): number {
  return found === certified ? 16 : -Math.log10(Math.abs((found - certified) / certified));
}
