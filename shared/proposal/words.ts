/** A share as people read it, never rounded to the safe side of 100 %: 1.002 is "101 %". */
export function percentText(share: number): string {
  return Number.isFinite(share) ? `${Math.ceil(share * 100 - 1e-9)} %` : 'no strength at all'
}
