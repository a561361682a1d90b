/** ΔR of a level surface that faces the whole sky [W/m²], ASHRAE Fundamentals, sol-air temperature. */
const LEVEL_SKY_LOSS = 63;

/**
 * ΔR [W/m²]: how much more a black surface at air temperature sends out than it takes in from sky and surroundings.
 * ASHRAE Fundamentals gives 63 for a level surface facing up and 0 for an upright one; in between it is taken in
 * proportion to cos β, as a sky as much colder than the air as the ground is warmer would have it, and downward as 0
 * (common practice, no source).
 *
 * @param tilt β, degrees from level
 */
export function skyLoss(tilt: number): number {
  return tilt >= 90 ? 0 : LEVEL_SKY_LOSS * Math.cos((tilt * Math.PI) / 180);
}
