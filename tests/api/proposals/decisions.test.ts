import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { gearSchema } from '../../../shared/schemas/gear'
import { proposalSchema } from '../../../shared/schemas/proposals'
import { expectProblem, listPointers } from '../problems'
import {
  addHeater,
  approve,
  countRows,
  decide,
  draft,
  measured,
  propose,
  send,
  startDesk,
  submit,
  type Desk,
} from './proposing'

let desk: Desk

beforeAll(async () => {
  desk = await startDesk()
})

afterAll(() => desk.stop())

const readGear = async (slug: string) =>
  gearSchema.parse((await send(desk, null, 'get', `/gear/${slug}`).expect(200)).body)

const sendBack = { decision: 'send-back', reasonCode: 'question', words: 'With or without the cap?' }
const decline = { decision: 'decline', reasonCode: 'not-backed', words: 'Nothing backs it.' }

describe('approving', () => {
  it('makes a revision of a change, with value, audit, talk and letter', async () => {
    const slug = await addHeater(desk)
    const proposal = await propose(desk, slug, { powerW: measured(200), lengthMm: { ...measured(230), raw: '23 cm' } })
    const before = await countRows(desk)
    const decided = await approve(desk, proposal)
    expect(decided).toMatchObject({ status: 'approved', revision: 2, decision: { by: 'Quill Sounding' } })
    expect(decided.can).toMatchObject({ decide: false, lease: false })
    const after = await countRows(desk)
    expect(after).toEqual({
      gear: before.gear,
      gear_revisions: (before.gear_revisions ?? 0) + 1,
      gear_values: (before.gear_values ?? 0) + 2,
      audit_events: (before.audit_events ?? 0) + 1,
      proposal_messages: (before.proposal_messages ?? 0) + 1,
      outbox: (before.outbox ?? 0) + 1,
    })
    const piece = await readGear(slug)
    expect(piece).toMatchObject({ revision: 2, specs: { powerW: 200, lengthMm: 230 } })
    expect(piece.provenance.lengthMm).toMatchObject({ author: 'Nettle Brine', revision: 2, source: 'measured' })
  })

  it('adds a new piece to the catalogue', async () => {
    const identity = { brand: 'Quillmoor Testworks', model: 'Brand New 9' }
    const body = { kind: 'heater', identity, values: { powerW: measured(90) } }
    const decided = await approve(desk, await submit(desk, await draft(desk, body)))
    expect(decided.gear).toMatchObject({ slug: 'quillmoor-testworks-brand-new-9', revision: 1 })
    expect(await readGear('quillmoor-testworks-brand-new-9')).toMatchObject({ ...identity, specs: { powerW: 90 } })
    const twin = await submit(desk, await draft(desk, body))
    expectProblem(await decide(desk, twin, { decision: 'approve' }), 409)
    expect((await send(desk, desk.member, 'get', `/proposals/${twin.id}`)).body).toMatchObject({ status: 'pending' })
  })

  it('leaves out the fields that are declined, with words for each', async () => {
    const slug = await addHeater(desk)
    const proposal = await propose(desk, slug, { powerW: measured(200), lengthMm: measured(230) })
    const wordless = {
      decision: 'approve',
      fields: { lengthMm: { decision: 'decline' }, colour: { decision: 'approve' } },
    }
    expect(listPointers(expectProblem(await decide(desk, proposal, wordless), 422))).toEqual([
      '#/fields/lengthMm/words',
    ])
    const fields = { lengthMm: { decision: 'decline', words: 'Measured with its cable' } }
    const response = await decide(desk, proposal, { decision: 'approve', fields })
    expect(proposalSchema.parse(response.body).decision?.fields).toEqual(fields)
    expect(await readGear(slug)).toMatchObject({ specs: { powerW: 200, lengthMm: 220 } })
  })

  it('refuses fields that are not proposed, and to approve nothing', async () => {
    const slug = await addHeater(desk)
    const proposal = await propose(desk, slug, { powerW: measured(200) })
    const unknown = { decision: 'approve', fields: { lengthMm: { decision: 'approve' } } }
    expect(listPointers(expectProblem(await decide(desk, proposal, unknown), 422))).toEqual(['#/fields/lengthMm'])
    const nothing = { decision: 'approve', fields: { powerW: { decision: 'decline', words: 'No' } } }
    expect(listPointers(expectProblem(await decide(desk, proposal, nothing), 422))).toEqual(['#/fields'])
  })

  it('takes in what was changed elsewhere meanwhile, and asks about what was changed on both sides', async () => {
    const slug = await addHeater(desk)
    const early = await propose(desk, slug, { powerW: measured(200), lengthMm: measured(231) })
    await approve(desk, await propose(desk, slug, { powerW: measured(175), diameterMm: measured(26) }))
    const seen = proposalSchema.parse((await send(desk, desk.moderator, 'get', `/proposals/${early.id}`)).body)
    expect(seen.conflicts).toEqual(['powerW'])
    expect(seen.fields.powerW).toMatchObject({ base: { value: 150 }, now: { value: 175 }, proposed: { value: 200 } })
    expect(seen.fields.lengthMm).toMatchObject({ state: 'change', now: { value: 220 } })
    const blind = expectProblem(await decide(desk, seen, { decision: 'approve' }), 409)
    expect(listPointers(blind)).toEqual(['#/fields/powerW'])
    expect(await readGear(slug)).toMatchObject({ revision: 2 })
    const fields = { powerW: { decision: 'approve' } }
    expect((await decide(desk, seen, { decision: 'approve', fields })).status).toBe(200)
    expect(await readGear(slug)).toMatchObject({ revision: 3, specs: { powerW: 200, lengthMm: 231, diameterMm: 26 } })
  })

  it('leaves nothing of itself behind where it fails half way', async () => {
    const slug = await addHeater(desk)
    const proposal = await propose(desk, slug, { powerW: measured(200) })
    const before = await countRows(desk)
    const owner = `create function fail_now() returns trigger language plpgsql as $$ begin raise 'torn'; end $$;
      create trigger torn before insert on outbox for each row execute function fail_now()`
    const { Client } = await import('pg').then(({ default: pg }) => pg)
    const client = new Client({ connectionString: desk.database.ownerUrl })
    await client.connect()
    await client.query(owner)
    expectProblem(await decide(desk, proposal, { decision: 'approve' }), 500)
    await client.query('drop trigger torn on outbox; drop function fail_now()')
    await client.end()
    expect(await countRows(desk)).toEqual(before)
    expect(await readGear(slug)).toMatchObject({ revision: 1, specs: { powerW: 150 } })
    expect((await send(desk, desk.member, 'get', `/proposals/${proposal.id}`)).body).toMatchObject({
      status: 'pending',
    })
    await approve(desk, proposal)
  })
})

describe('who decides', () => {
  it('is never the author, never a member, never a visitor', async () => {
    const slug = await addHeater(desk)
    const own = await propose(desk, slug, { powerW: measured(200) }, {}, desk.moderator)
    expectProblem(await decide(desk, own, { decision: 'approve' }), 403)
    expectProblem(await send(desk, desk.moderator, 'post', `/proposals/${own.id}/lease`), 403)
    expectProblem(await decide(desk, own, { decision: 'approve' }, desk.member), 403)
    expectProblem(await decide(desk, own, { decision: 'approve' }, {} as never), 401)
    expectProblem(await send(desk, desk.member, 'get', '/review'), 403)
    expectProblem(await send(desk, null, 'get', '/review'), 401)
    expect(await readGear(slug)).toMatchObject({ revision: 1 })
  })

  it('is one of 50 who try at once; the others hear who it was', async () => {
    const slug = await addHeater(desk)
    const proposal = await propose(desk, slug, { powerW: measured(200) })
    const before = await countRows(desk)
    const tries = Array.from({ length: 50 }, (_, index) =>
      decide(
        desk,
        proposal,
        index % 2 === 0 ? { decision: 'approve' } : decline,
        index % 3 ? desk.moderator : desk.admin,
      ),
    )
    const answers = await Promise.all(tries)
    expect(answers.filter(({ status }) => status === 200)).toHaveLength(1)
    const lost = answers.filter(({ status }) => status !== 200)
    for (const answer of lost) expect(expectProblem(answer, 409).detail).toMatch(/by (Quill Sounding|Plumb Harbour)/)
    const after = await countRows(desk)
    expect(after.audit_events).toBe((before.audit_events ?? 0) + 1)
    expect(after.outbox).toBe((before.outbox ?? 0) + 1)
  })

  it('cannot approve what was declined', async () => {
    const slug = await addHeater(desk)
    const proposal = await propose(desk, slug, { powerW: measured(200) })
    const declined = proposalSchema.parse((await decide(desk, proposal, decline)).body)
    expect(declined).toMatchObject({ status: 'declined', decision: { reasonCode: 'not-backed' } })
    expectProblem(await decide(desk, declined, { decision: 'approve' }, desk.admin), 409)
    expect(await readGear(slug)).toMatchObject({ revision: 1 })
  })

  it('says why: a reason of its own kind and words, or nothing happens', async () => {
    const slug = await addHeater(desk)
    const proposal = await propose(desk, slug, { powerW: measured(200) })
    const wrong = { decision: 'decline', reasonCode: 'question' }
    expect(listPointers(expectProblem(await decide(desk, proposal, wrong), 422))).toEqual(['#/reasonCode', '#/words'])
    expectProblem(
      await send(desk, desk.moderator, 'post', `/proposals/${proposal.id}/decision`, { body: decline }),
      428,
    )
  })
})

describe('sending back', () => {
  it('asks the author, who amends and sends it in again', async () => {
    const slug = await addHeater(desk)
    const proposal = await propose(desk, slug, { powerW: measured(200) })
    const back = proposalSchema.parse((await decide(desk, proposal, sendBack)).body)
    expect(back).toMatchObject({ status: 'sent-back', decision: { reasonCode: 'question', words: sendBack.words } })
    const { rows } = await desk.client.pool.query<{ text_body: string }>(
      `select text_body from outbox where kind = 'proposal.sent-back' order by created_at desc limit 1`,
    )
    expect(rows[0]?.text_body).toContain(sendBack.words)
    const body = { values: { powerW: measured(210) } }
    const amended = await send(desk, desk.member, 'patch', `/proposals/${back.id}`, { body, version: back.version })
    const again = await submit(desk, proposalSchema.parse(amended.body))
    await approve(desk, again)
    expect(await readGear(slug)).toMatchObject({ specs: { powerW: 210 } })
  })

  it('shows a moderator whose view is older that the author amended it', async () => {
    const slug = await addHeater(desk)
    const proposal = await propose(desk, slug, { powerW: measured(200) })
    const body = { values: { powerW: measured(210) } }
    const { version } = proposal
    await send(desk, desk.member, 'patch', `/proposals/${proposal.id}`, { body, version }).expect(200)
    const stale = expectProblem(await decide(desk, proposal, { decision: 'approve' }), 412)
    expect(stale.current).toMatchObject({ version: version + 1, values: { powerW: { value: 210 } } })
  })
})

describe('a lease', () => {
  it('keeps others from deciding until it is given up or runs out; reading needs none', async () => {
    const slug = await addHeater(desk)
    const proposal = await propose(desk, slug, { powerW: measured(200) })
    const path = `/proposals/${proposal.id}/lease`
    const leased = proposalSchema.parse((await send(desk, desk.moderator, 'post', path).expect(200)).body)
    expect(leased.lease).toMatchObject({ holder: 'Quill Sounding', isMine: true })
    expect(expectProblem(await send(desk, desk.admin, 'post', path), 409).detail).toContain('Quill Sounding')
    expect(expectProblem(await decide(desk, proposal, { decision: 'approve' }, desk.admin), 409).detail).toContain(
      'Quill Sounding',
    )
    await send(desk, desk.admin, 'get', `/proposals/${proposal.id}`).expect(200)
    await desk.client.pool.query(`update proposals set leased_until = now() - interval '1 second' where id = $1`, [
      proposal.id,
    ])
    const taken = await send(desk, desk.admin, 'post', path).expect(200)
    expect(taken.body).toMatchObject({ lease: { holder: 'Plumb Harbour', isMine: true } })
    expect((await send(desk, desk.admin, 'delete', path).expect(200)).body).toMatchObject({ lease: null })
    await approve(desk, proposal)
  })
})
