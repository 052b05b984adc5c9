import { describe, expect, it } from 'vitest'
import { drawStand } from '#shared/engine/drawings/stand'
import { piece, wholeSetup } from '../build'

const stand = (topLengthMm: number, topWidthMm: number | undefined, heightMm?: number) =>
  piece('stand', { topLengthMm, topWidthMm, heightMm })

// The tank of every setup here is 620 × 420 × 400 mm outside; the spares are subtractions.
describe('a tank on a stand, drawn', () => {
  it('leaves what the top has over, along and across', () => {
    expect(drawStand(wholeSetup(), stand(640, 430, 750))).toEqual({
      top: { lengthMm: 640, widthMm: 430 },
      tank: { lengthMm: 620, widthMm: 420, heightMm: 400 },
      spareMm: { length: 20, width: 10 },
      isTurned: false,
      standHeightMm: 750,
      assumed: { length: false, width: false, height: false },
    })
  })

  it('turns the tank where it only stands across', () => {
    expect(drawStand(wholeSetup(), stand(450, 700))).toMatchObject({
      tank: { lengthMm: 420, widthMm: 620 },
      spareMm: { length: 30, width: 80 },
      isTurned: true,
      standHeightMm: null,
    })
  })

  it('tells how far the tank stands over', () => {
    expect(drawStand(wholeSetup(), stand(600, 500))!.spareMm).toEqual({ length: -20, width: 80 })
  })

  it('marks the size of a tank of which only the volume was said as assumed', () => {
    const drawn = drawStand({ units: 'us', tank: { specs: {}, volumeL: 75.7 }, items: [] }, stand(640, 430))!
    expect(drawn.assumed).toEqual({ length: true, width: true, height: true })
  })

  it('draws nothing on a top that nobody measured', () => {
    expect(drawStand(wholeSetup(), stand(640, undefined))).toBeNull()
  })
})
