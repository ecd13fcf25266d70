import type { Point } from './scene.ts'

/** Fits a thing of `across` by `down` mm to a square room and returns the mapping from mm (y up) to the sheet. */
export interface PlanFrame {
  scale: number
  left: number
  right: number
  top: number
  bottom: number
  centre: Point
  place: (point: readonly [number, number]) => Point
}

export function framePlan(
  size: { across: number; down: number },
  room: { left: number; top: number; width: number; height: number },
): PlanFrame {
  const scale = Math.min(room.width / size.across, room.height / size.down)
  const [across, down] = [size.across * scale, size.down * scale]
  const left = room.left + (room.width - across) / 2
  const centre: Point = [left + across / 2, room.top + down / 2]
  return {
    scale,
    left,
    right: left + across,
    top: room.top,
    bottom: room.top + down,
    centre,
    place: ([x, y]) => [centre[0] + x * scale, centre[1] - y * scale],
  }
}
