import type { Section } from '../sections/section.ts'
import type { PlateSize } from './base-design.ts'
import { rodRoom } from './rods.ts'

/** Between washer and weld, for the wrench, by shop practice, mm. */
const WRENCH = 10
/** Beside the shaft for the weld and its run-off, by shop practice, mm. */
const WELD_ROOM = 25
/** Plates are cut to the next whole one of these, mm. */
export const PLATE_MODULE = 10
/** A plate of exactly the least size has room. */
const TOLERANCE = 1e-6

type Place = [number, number]

export function upToModule(length: number): number {
  return Math.ceil(length / PLATE_MODULE - 1e-9) * PLATE_MODULE
}

interface Room {
  /** From the centre of a rod to the face of the shaft, to the edge of the plate, and to the next rod, mm. */
  toShaft: number
  toEdge: number
  apart: number
}

function roomOf(diameter: number, leg: number): Room {
  const { washer, hole } = rodRoom(diameter)
  return {
    toShaft: washer / 2 + leg + WRENCH,
    // The washer stays on the plate, and the hole keeps one and a half of itself to the edge.
    toEdge: Math.max(washer / 2, 0.75 * hole + diameter / 2),
    // Washers do not overlap; three diameters is what AISC 360-22 J3.4 prefers.
    apart: Math.max(washer, 3 * diameter),
  }
}

/** Least plate that has its rods outside the shaft along the length, mm. */
export function leastPlate(section: Section, diameter: number, leg: number, rodsOnSide: number): PlateSize {
  const { toShaft, toEdge, apart } = roomOf(diameter, leg)
  return {
    length: section.depth + 2 * (toShaft + toEdge),
    width: Math.max(section.width + 2 * WELD_ROOM, (rodsOnSide - 1) * apart + 2 * toEdge),
  }
}

/**
 * Centres of the rods from the plate's centre, along its length and its width: half of them on either side, out to the
 * corners; between the flanges of an I where there is no room outside. Undefined where there is none at all.
 */
export function layOutRods(
  section: Section,
  plate: PlateSize,
  rods: { count: number; diameter: number },
  leg: number,
): Place[] | undefined {
  const room = roomOf(rods.diameter, leg)
  const lines = [plate.length / 2 - room.toEdge]
  if (section.shape === 'I') lines.push(section.depth / 2 - section.tf - room.toShaft)
  const across = plate.width / 2 - room.toEdge
  for (const along of lines) {
    const places = inTwoRows(along, across, rods.count, room.apart)
    if (places?.every((place) => isClear(section, place, room.toShaft))) return places
  }
  return undefined
}

/** Undefined where rods would stand closer than they may. */
function inTwoRows(along: number, across: number, count: number, apart: number): Place[] | undefined {
  const first = Math.ceil(count / 2)
  if (2 * along < apart - TOLERANCE || 2 * across < (first - 1) * apart - TOLERANCE) return undefined
  return [...rowAt(-along, across, first), ...rowAt(along, across, count - first)]
}

function rowAt(along: number, across: number, count: number): Place[] {
  if (count === 1) return [[along, 0]]
  return Array.from({ length: count }, (_, index) => [along, -across + (2 * across * index) / (count - 1)])
}

/** Whether a rod has its room beside the shaft, or between the flanges of an I and beside its web. */
function isClear(section: Section, [x, y]: Place, toShaft: number): boolean {
  const { depth, width } = section
  const [along, across] = [Math.abs(x), Math.abs(y)]
  const need = toShaft - TOLERANCE
  if (section.shape === 'round') return Math.hypot(along, across) - depth / 2 >= need
  if (Math.hypot(Math.max(0, along - depth / 2), Math.max(0, across - width / 2)) >= need) return true
  if (section.shape !== 'I') return false
  return depth / 2 - section.tf - along >= need && across - section.tw / 2 >= need
}
