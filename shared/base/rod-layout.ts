import type { Section } from '../sections/section.ts'
import type { PlateSize } from './base-design.ts'
import { rodRoom } from './rods.ts'

/** Between washer and weld, for the wrench, by shop practice, mm. */
const WRENCH = 10
/** Beside the shaft for the weld and its run-off, by shop practice, mm. */
const WELD_ROOM = 25
/** Plates are cut to the next whole one of these, mm. */
export const PLATE_MODULE = 10

export function upToModule(length: number): number {
  return Math.ceil(length / PLATE_MODULE - 1e-9) * PLATE_MODULE
}

/** From the centre of a rod to the face of the shaft, and to the edge of the plate, mm. */
function room(diameter: number, leg: number): { toShaft: number; toEdge: number } {
  const { washer, hole } = rodRoom(diameter)
  // The washer stays on the plate, and the hole keeps one and a half of itself to the edge.
  return { toShaft: washer / 2 + leg + WRENCH, toEdge: Math.max(washer / 2, 0.75 * hole + diameter / 2) }
}

/** Least plate that has its rods outside the shaft along the length, mm. */
export function leastPlate(section: Section, diameter: number, leg: number, rodsOnSide: number): PlateSize {
  const { toShaft, toEdge } = room(diameter, leg)
  const abreast = (rodsOnSide - 1) * 3 * diameter + 2 * toEdge
  return {
    length: section.depth + 2 * (toShaft + toEdge),
    width: Math.max(section.width + 2 * WELD_ROOM, abreast),
  }
}

/**
 * Centres of the rods from the plate's centre, along its length and its width: half of them on either side, near the
 * corners; between the flanges of an I where the plate has no room outside. Undefined where there is none at all.
 */
export function layOutRods(
  section: Section,
  plate: PlateSize,
  rods: { count: number; diameter: number },
  leg: number,
): [number, number][] | undefined {
  const { toShaft, toEdge } = room(rods.diameter, leg)
  const along = lineOf(section, plate, toShaft, toEdge)
  const across = plate.width / 2 - toEdge
  if (along === undefined || across <= 0) return undefined
  const onOneSide = Math.ceil(rods.count / 2)
  return [...sideOf(-along, across, onOneSide), ...sideOf(along, across, rods.count - onOneSide)]
}

function lineOf(section: Section, plate: PlateSize, toShaft: number, toEdge: number): number | undefined {
  const outside = plate.length / 2 - toEdge
  if (outside >= section.depth / 2 + toShaft - 1e-6) return outside
  if (section.shape !== 'I') return undefined
  const inside = section.depth / 2 - section.tf - toShaft
  return inside >= toEdge ? inside : undefined
}

function sideOf(along: number, across: number, count: number): [number, number][] {
  if (count === 1) return [[along, 0]]
  return Array.from({ length: count }, (_, index) => [along, -across + (2 * across * index) / (count - 1)])
}
