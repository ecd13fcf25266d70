import type { Axis } from '../stability/column.ts'

/** The room above the column's head (load, sign) and below its foot (sign, bob, titles). */
const HEAD_ROOM = 62
const FOOT_ROOM = 96
/** Left margin in which the overall height stands. */
const MARGIN = 34
/** Room for a segment's length beside its dimension line. */
const TEXT_ROOM = 52
/** Where a view has its plumb line, as a part of what its text leaves: braces and their heights stand left of it. */
const PLUMB = 0.67
/** A shaft drawn narrower than this is no longer seen as two edges: it gets a width of its own and break lines. */
const NARROWEST = 7
const BROKEN_WIDTH = 11
/** Widest shaft that leaves room for what stands beside it, as a part of a view's width. */
const WIDEST = 0.28

export interface ColumnLayout {
  width: number
  height: number
  /** Sheet height of the column's foot and head. */
  foot: number
  head: number
  /** Sheet units for one mm of height. */
  scale: number
  /** Sheet units for one mm across the shaft; differs from `scale` when the shaft is broken. */
  across: number
  broken: boolean
  /** Where each axis's view has its plumb line, and how far its dimensions stand off. */
  views: Record<Axis, { x: number; halfShaft: number; dimension: number }>
  overall: number
  /** Too narrow for names beside values. */
  compact: boolean
}

export interface LayoutInput {
  columnHeight: number
  depth: number
  width: number
  sheet: { width: number; height: number }
}

/** Fits both views of a column to a sheet: heights to scale, the shaft to the same scale while that can be seen. */
export function layoutColumn({ columnHeight, depth, width, sheet }: LayoutInput): ColumnLayout {
  const view = (sheet.width - MARGIN) / 2
  const widest = Math.max(depth, width)
  const room = sheet.height - HEAD_ROOM - FOOT_ROOM
  const scale = Math.min(room / columnHeight, (view * WIDEST) / widest)
  const broken = Math.min(depth, width) * scale < NARROWEST
  const across = broken ? Math.max(scale, BROKEN_WIDTH / widest) : scale
  const head = HEAD_ROOM
  const foot = head + columnHeight * scale
  const at = (left: number, size: number) => {
    const dimension = left + view - TEXT_ROOM
    return { x: left + (view - TEXT_ROOM) * PLUMB, halfShaft: (size * across) / 2, dimension }
  }
  return {
    width: sheet.width,
    height: foot + FOOT_ROOM,
    foot,
    head,
    scale,
    across,
    broken,
    views: { strong: at(MARGIN, depth), weak: at(MARGIN + view, width) },
    overall: MARGIN - 10,
    compact: sheet.width < 400,
  }
}
