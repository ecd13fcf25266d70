/** E2, User Note: a member in compression should not be more slender than this. Advice, not a limit of strength. */
export const ADVISED_COMPRESSION_SLENDERNESS = 200
/** D1, User Note: a member in tension should not be more slender than this. */
export const ADVISED_TENSION_SLENDERNESS = 300

/**
 * Effective slenderness ratio: Lc/r.
 * Lc effective length and r radius of gyration about the same axis, in one unit; both more than 0.
 * ANSI/AISC 360-22 E2 (360-16 alike).
 */
export function slenderness(Lc: number, r: number): number {
  return Lc / r
}
