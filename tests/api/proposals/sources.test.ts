import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { gearSchema, revisionSchema } from '../../../shared/schemas/gear'
import { valueSourcesSchema } from '../../../shared/schemas/review'
import { expectProblem, listPointers } from '../problems'
import { addHeater, approve, decide, draft, measured, propose, send, startDesk, type Desk } from './proposing'

let desk: Desk

beforeAll(async () => {
  desk = await startDesk()
})

afterAll(() => desk.stop())

const readGear = async (slug: string) =>
  gearSchema.parse((await send(desk, null, 'get', `/gear/${slug}`).expect(200)).body)

const change = async (slug: string, values: object, who = desk.member) =>
  approve(desk, await propose(desk, slug, values, {}, who), who === desk.moderator ? desk.admin : desk.moderator)

describe('several sources of one value', () => {
  it('are all kept, and the newest of the highest rank is used', async () => {
    const slug = await addHeater(desk)
    const pending = await propose(desk, slug, { powerW: measured(160, 'maker') })
    expect(pending.fields.powerW).toMatchObject({ state: 'shadowed', now: { value: 150 } })
    await approve(desk, pending)
    const piece = await readGear(slug)
    expect(piece).toMatchObject({ revision: 2, specs: { powerW: 150 } })
    expect(piece.sources.powerW).toMatchObject([
      { value: 150, source: 'measured', isUsed: true, revision: 1 },
      { value: 160, source: 'maker', isUsed: false, revision: 2, author: 'Nettle Brine', reviewer: 'Quill Sounding' },
    ])
    expect(piece.provenance.powerW).toMatchObject({ source: 'measured', revision: 1 })
    await change(slug, { powerW: { ...measured(155), raw: '155 W' } }, desk.moderator)
    const newer = await readGear(slug)
    expect(newer.specs.powerW).toBe(155)
    expect(newer.provenance.powerW).toMatchObject({ raw: '155 W', author: 'Quill Sounding' })
    const sources = await send(desk, null, 'get', `/gear/${slug}/sources/powerW`).expect(200)
    const { items } = valueSourcesSchema.parse(sources.body)
    expect(items.map(({ value }) => value)).toEqual([155, 160, 150])
    expectProblem(await send(desk, null, 'get', `/gear/${slug}/sources/wingspanMm`), 404)
  })

  it('stand in the history, each revision with what was in use then', async () => {
    const slug = await addHeater(desk)
    await change(slug, { powerW: measured(160, 'estimate') })
    await change(slug, { powerW: measured(170) })
    const second = revisionSchema.parse((await send(desk, null, 'get', `/gear/${slug}/revisions/2`)).body)
    expect(second).toMatchObject({ changed: ['powerW'], specs: { powerW: 150 }, author: 'Nettle Brine' })
    expect(second.provenance.powerW).toMatchObject({ source: 'measured', revision: 1 })
  })

  it('of one person and kind of source the newest alone counts', async () => {
    const slug = await addHeater(desk)
    await change(slug, { powerW: measured(160) })
    await change(slug, { powerW: measured(170) })
    expect((await readGear(slug)).sources.powerW?.map(({ value }) => value)).toEqual([170, 150])
  })
})

describe('a value that goes to and fro', () => {
  it('is not turned a third time: a dispute opens, and a moderator settles it', async () => {
    const slug = await addHeater(desk)
    await change(slug, { powerW: measured(200) })
    await change(slug, { powerW: measured(150) }, desk.moderator)
    const third = await draft(desk, { kind: 'heater', gear: slug, baseRevision: 3, values: { powerW: measured(200) } })
    const path = `/proposals/${third.id}/submit`
    const refused = expectProblem(await send(desk, desk.member, 'post', path, { version: 1 }), 409)
    expect(listPointers(refused)).toEqual(['#/values/powerW'])
    expect((await readGear(slug)).disputed).toEqual(['powerW'])
    const kept = await send(desk, desk.member, 'get', `/proposals/${third.id}`).expect(200)
    expect(kept.body).toMatchObject({ status: 'draft', values: { powerW: { value: 200 } } })
    const other = await draft(desk, { kind: 'heater', gear: slug, baseRevision: 3, values: { powerW: measured(180) } })
    expectProblem(await send(desk, desk.member, 'post', `/proposals/${other.id}/submit`, { version: 1 }), 409)
  })

  it('is not turned by a proposal that waited meanwhile either, unless that field is declined', async () => {
    const slug = await addHeater(desk)
    await change(slug, { powerW: measured(200) })
    const waiting = await propose(desk, slug, { powerW: measured(200), lengthMm: measured(225) })
    await change(slug, { powerW: measured(150) }, desk.moderator)
    const fields = { powerW: { decision: 'approve' } }
    expectProblem(await decide(desk, waiting, { decision: 'approve', fields }), 409)
    expect(await readGear(slug)).toMatchObject({ revision: 3, disputed: ['powerW'] })
    const declined = { powerW: { decision: 'decline', words: 'In dispute now' } }
    expect((await decide(desk, waiting, { decision: 'approve', fields: declined })).status).toBe(200)
    expect(await readGear(slug)).toMatchObject({ revision: 4, specs: { powerW: 150, lengthMm: 225 } })
  })
})
