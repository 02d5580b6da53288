/**
 * Density of seawater at the surface [t/m³] from its temperature [°C] and practical salinity: a guard against typing errors.
 *
 *     ρ = ρ_w(t) + (b₀…b₄)(t)·S + (c₀…c₂)(t)·S^(3/2) + d₀·S²
 *
 * Valid from −2 to 40 °C and salinity 0 to 42, to 4e-6 t/m³. The temperature is today's scale (ITS-90) and is converted to
 * that of the formula (t₆₈ = 1.00024·t₉₀). The caller keeps to the range: see `isWithinSeawaterRange`.
 *
 * Source: Fofonoff & Millard, Algorithms for computation of fundamental properties of seawater, UNESCO Technical Papers in
 * Marine Science 44 (1983), EOS-80; scale: Saunders, WOCE Newsletter 10 (1990) (from memory).
 */
export function seawaterDensity(temperatureCelsius: number, salinity: number): number {
  if (!isWithinSeawaterRange(temperatureCelsius, salinity))
    throw new RangeError(`seawater at ${temperatureCelsius} °C, salinity ${salinity}`);
  const t = 1.00024 * temperatureCelsius;
  const perCubicMetre =
    polynomial(freshWater, t) +
    polynomial(perSalinity, t) * salinity +
    polynomial(perSalinityRoot, t) * salinity ** 1.5 +
    4.8314e-4 * salinity ** 2;
  return perCubicMetre / 1000;
}

/** Whether the formula holds there: −2 to 40 °C, salinity 0 to 42. Source: UNESCO Technical Papers in Marine Science 44 (1983). */
export function isWithinSeawaterRange(temperatureCelsius: number, salinity: number): boolean {
  return temperatureCelsius >= -2 && temperatureCelsius <= 40 && salinity >= 0 && salinity <= 42;
}

/** Lowest and highest density that natural water can have at a temperature: fresh, and salinity 42 [t/m³]. */
export function naturalWaterRange(temperatureCelsius: number): readonly [number, number] {
  return [seawaterDensity(temperatureCelsius, 0), seawaterDensity(temperatureCelsius, 42)];
}

// coefficients in ascending powers of t
const freshWater = [999.842594, 6.793952e-2, -9.09529e-3, 1.001685e-4, -1.120083e-6, 6.536332e-9];
const perSalinity = [8.24493e-1, -4.0899e-3, 7.6438e-5, -8.2467e-7, 5.3875e-9];
const perSalinityRoot = [-5.72466e-3, 1.0227e-4, -1.6546e-6];

function polynomial(coefficients: readonly number[], t: number): number {
  return coefficients.reduceRight((total, coefficient) => total * t + coefficient, 0);
}
