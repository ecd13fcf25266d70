/** The one of which the measure is the least, the first of equals. */
export function leastBy<T>(all: readonly T[], measure: (one: T) => number): T | undefined {
  let least: T | undefined
  let smallest = Infinity
  for (const one of all) {
    const size = measure(one)
    if (size < smallest) [least, smallest] = [one, size]
  }
  return least
}
