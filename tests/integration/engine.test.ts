import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { AnswerOf } from '../../shared/contracts/operations.ts'
import { columnLine } from '../support/round.ts'
import { startTestApp, type Agent, type TestApp } from '../support/test-app.ts'

let app: TestApp
let contractor: Agent
beforeAll(async () => {
  app = await startTestApp()
  contractor = await app.signIn('contractor')
})
afterAll(() => app.stop())

describe('the engine', () => {
  it('answers a check with every step, and refuses by field', async () => {
    const { mark: _m, quantity: _q, ...requirement } = columnLine()
    const reply = await contractor
      .post('/api/checks')
      .send({ ...requirement, section: 'w10 x 49' })
      .expect(200)
    const check = reply.body as AnswerOf<'checkColumn'>
    expect(check.verdict).toBe('holds')
    expect(check.checks.find(({ clause }) => clause === 'E3')?.steps.length).toBeGreaterThan(3)
    expect(check.lengths.weak.used).toBe(3000)
    const bad = await contractor
      .post('/api/checks')
      .send({ ...requirement, height: -1, section: 'W10X49' })
      .expect(422)
    expect(bad.body).toMatchObject({ type: 'refused', errors: [{ path: 'height' }] })
    const none = await contractor
      .post('/api/checks')
      .send({ ...requirement, section: 'W0X0' })
      .expect(422)
    expect(none.body).toMatchObject({ errors: [{ path: 'section' }] })
  })

  it('finds a base plate, and lists the catalogue', async () => {
    const base = await contractor
      .post('/api/base-plates')
      .send({
        section: 'W10X49',
        required: { compression: 900_000, uplift: 0 },
        concrete: { strength: 28, pier: { length: 500, width: 500 } },
      })
      .expect(200)
    const { verdict, rods, values } = base.body as AnswerOf<'designBasePlate'>
    expect(verdict).toBe('holds')
    expect(rods.positions).toHaveLength(4)
    expect(values.erectionMoment).toBeGreaterThan(0)
    const list = await contractor.get('/api/sections?family=W&q=10x4').expect(200)
    expect((list.body as AnswerOf<'listSections'>).items.map(({ designation }) => designation)).toContain(
      'W10X49',
    )
    await contractor.get('/api/sections/W250X73').expect(200)
  })
})
