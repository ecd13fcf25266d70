/** Outline perimeter of a rolled I, mm: both flanges and the web, less the corners that the four root fillets cut off. */
export function perimeterOfI(depth: number, width: number, web: number, fillet: number): number {
  return 4 * width + 2 * depth - 2 * web - (8 - 2 * Math.PI) * fillet
}

/** Outline perimeter of a rectangle with rounded corners, mm. */
export function perimeterOfBox(depth: number, width: number, corner: number): number {
  return 2 * (depth + width) - (8 - 2 * Math.PI) * corner
}

/** Area, second moment and plastic modulus of a ring from its outside diameter and wall: mm², mm⁴, mm³. */
export function ring(diameter: number, wall: number): { area: number; I: number; Z: number } {
  const inside = diameter - 2 * wall
  return {
    area: (Math.PI / 4) * (diameter ** 2 - inside ** 2),
    I: (Math.PI / 64) * (diameter ** 4 - inside ** 4),
    Z: (diameter ** 3 - inside ** 3) / 6,
  }
}
