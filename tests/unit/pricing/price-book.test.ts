import { describe, expect, it } from 'vitest'
import { DEFAULT_PRICE_BOOK as book } from '../../../seeds/reference/price-book.ts'
import { priceBookAnswer } from '../../../shared/contracts/admin.ts'
import { barPriceOf, rodPriceOf } from '../../../shared/pricing/price-book.ts'
import { priceBookSheet } from '../../../shared/pricing/price-book-sheet.ts'
import { US_FAMILIES } from '../../../shared/sections/catalogue.ts'

describe('the first price book', () => {
  it('has bars for every family on offer', () => {
    for (const family of US_FAMILIES) expect(barPriceOf(book, family)?.title).toBeTruthy()
    expect(barPriceOf(book, 'IPE')).toBeUndefined()
  })

  it('keeps its plates, rods and bars in ascending order', () => {
    const rods = book.rods.prices.map(({ diameter }) => diameter)
    for (const list of [book.plate.thicknesses, rods, ...book.bars.map((bar) => bar.stockLengths)]) {
      expect([...list].sort((a, b) => a - b)).toEqual(list)
      expect(new Set(list).size).toBe(list.length)
    }
  })

  it.each([
    [19.05, '11.50'],
    [19, '11.50'],
    [20, '19.00'],
    [25.4, '19.00'],
    [38.1, '46.00'],
  ])('a rod of %d mm costs %s', (diameter, each) => {
    expect(rodPriceOf(book, diameter)?.each).toBe(each)
  })

  it('has no rod above 38.1 mm', () => {
    expect(rodPriceOf(book, 39)).toBeUndefined()
  })
})

describe('a price book to be read', () => {
  const groups = priceBookSheet(book)

  it('fits its contract and names each figure once', () => {
    priceBookAnswer.parse({ version: book.version, firstDay: book.firstDay, currency: book.currency, groups })
    const names = groups.flatMap(({ rows }) => rows.map(({ name, unit }) => `${name} ${unit}`))
    expect(new Set(names).size).toBe(names.length)
  })

  it('shows every figure that the book holds', () => {
    const shown = groups.flatMap(({ rows }) => rows.map(({ value }) => value)).join(' | ')
    const figures = JSON.stringify(book).match(/"\d+\.\d+"/g) ?? []
    expect(figures.length).toBeGreaterThan(25)
    for (const quoted of figures) {
      const figure = quoted.slice(1, -1)
      const asPercent = String(Math.round(Number(figure) * 1e6) / 1e4)
      expect([figure, asPercent].some((text) => shown.includes(text))).toBe(true)
    }
  })
})
