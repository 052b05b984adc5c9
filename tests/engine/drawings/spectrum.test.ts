import { expect, it } from 'vitest'
import { drawSpectrum } from '#shared/engine/drawings/spectrum'
import { piece } from '../build'

it('puts bands in the order of their wavelengths and adds up what is blue', () => {
  // Of the band from 450 to 550 nm half lies below 500: 0.3 + 0.2 / 2.
  const drawn = drawSpectrum(
    piece('light', {
      bands: [
        { fromNm: 450, toNm: 550, share: 0.2 },
        { fromNm: 600, toNm: 700, share: 0.5 },
        { fromNm: 400, toNm: 450, share: 0.3 },
      ],
    }),
  )!
  expect(drawn.bands.map(({ fromNm }) => fromNm)).toEqual([400, 450, 600])
  expect(drawn.blueShare).toBeCloseTo(0.4, 9)
})

it('draws nothing of a spectrum that nobody recorded', () => {
  expect(drawSpectrum(piece('light', {}))).toBeNull()
  expect(drawSpectrum(piece('light', { bands: [] }))).toBeNull()
})
