/** Standard gravity, m/s². */
export const STANDARD_GRAVITY = 9.80665

/** Weight of the column itself, N: mass per metre, kg/m × standard gravity × height, mm. */
export function selfWeight(massPerMetre: number, height: number): number {
  return (massPerMetre * STANDARD_GRAVITY * height) / 1000
}
