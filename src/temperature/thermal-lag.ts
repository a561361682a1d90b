/**
 * A first-order member's temperature after one step [°C], exact for surroundings that change in a straight line:
 * τ dT/dt = f − T gives T₁ = f₁ − (f₁ − f₀)(1 − e^−q)/q + (T₀ − f₀) e^−q.
 *
 * @param temperature T₀ at the start of the step [°C]
 * @param from f₀, what the member strives for at the start of the step [°C]
 * @param to f₁, the same at its end [°C]
 * @param step q, the step over the time constant τ; `Infinity` is a member without heat capacity
 */
export function lagStep(temperature: number, from: number, to: number, step: number): number {
  const reached = -Math.expm1(-step);
  const behind = step === 0 ? 1 : reached / step;
  return to - (to - from) * behind + (temperature - from) * (1 - reached);
}

/** A metre of member as a store of heat. */
export interface HeatStore {
  /** Mass [kg/m]. */
  readonly mass: number;
  /** Specific heat capacity [J/(kg·K)]. */
  readonly heatCapacity: number;
  /** Perimeter that trades heat with the air [mm]. */
  readonly exposedPerimeter: number;
}

/**
 * Time constant of a thin member [h]: τ = m·c/(h·u), the lumped heat balance (Biot number well under 0.1).
 *
 * @param film h [W/(m²·K)], over 0
 */
export function timeConstant(store: HeatStore, film: number): number {
  const perimeter = store.exposedPerimeter / 1000;
  return (store.mass * store.heatCapacity) / (film * perimeter) / 3600;
}
