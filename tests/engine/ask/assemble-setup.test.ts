import { describe, expect, it } from 'vitest'
import { readQuestion } from '#shared/engine/ask/read-question'
import { assembleSetup } from '#shared/schemas/assemble-setup'

const assemble = (text: string, system: 'us' | 'metric' = 'us') =>
  assembleSetup(readQuestion(text, system).fields, system)

describe('the setup that a question tells of', () => {
  it('nests tank, chambers and room, each chamber with an id that items can name', () => {
    expect(assemble('20 gallons, a 4 x 5 x 12 inch rear chamber, flat gets down to 60 °F')).toEqual({
      units: 'us',
      // 20 × 231 in³ and 25.4 mm to the inch (NIST SP 811, appendix B); (60 − 32) × 5/9 °C.
      tank: {
        volumeL: expect.closeTo(75.70823568, 8) as number,
        chambers: [
          {
            id: 'rear-1',
            lengthMm: expect.closeTo(101.6, 8) as number,
            widthMm: expect.closeTo(127, 8) as number,
            waterDepthMm: expect.closeTo(304.8, 8) as number,
          },
        ],
      },
      room: { coldestC: expect.closeTo(15.5555555556, 8) as number },
      items: [],
    })
  })

  it('keeps choices, sets and both ends of a turnover', () => {
    expect(assemble('UK, rimless acrylic, SPS and zoas, no gfci, turnover of 5-10 times per hour', 'metric')).toEqual({
      units: 'metric',
      country: 'GB',
      tank: { rim: 'rimless', material: 'acrylic' },
      mains: { volts: 230, plugType: 'G', residualCurrentProtected: false },
      goals: { coral: ['soft', 'sps'], turnoverPerHour: [5, 10] },
      items: [],
    })
  })

  it('is empty where the question tells nothing', () => {
    expect(assemble('which heater?')).toEqual({ units: 'us', tank: {}, items: [] })
  })
})
