import { render, screen } from '@testing-library/react'
import { describe, expect, it, vi } from 'vitest'
import { fitCheck } from '#shared/engine/fit'
import type { Piece } from '#shared/engine/types'
import { createPrinter } from '#shared/units/print'
import { AnswerDrawing } from '../../../src/components/setup/answer-drawing'
import { findPlan } from '../../../src/components/setup/find-plan'
import { cluster, pumps, setups, stands } from '../specimen/invented-gear'

class StillObserver implements ResizeObserver {
  observe(): void {}
  unobserve(): void {}
  disconnect(): void {}
}

const shut: Piece = { kind: 'return-pump', specs: {} }
const net: Piece = { kind: 'net', specs: {} }

function draw(piece: Piece) {
  vi.stubGlobal('ResizeObserver', StillObserver)
  const answer = fitCheck(setups.cube, piece)
  const printer = createPrinter('metric')
  const { plan } = findPlan(setups.cube)
  return render(<AnswerDrawing answer={answer} plan={plan} given={new Set()} printer={printer} />)
}

describe('the drawing of an answer', () => {
  it.each([
    ['a light over the display, and its spectrum', cluster, ['Light half way down', 'Spectrum']],
    ['a pump where it works', pumps.controlled, ['Where the pump works']],
    ['the tank on a stand', stands[0]!, ['From above', 'From the front']],
  ])('shows %s as pictures with words', (_, piece, titles) => {
    draw(piece)
    const pictures = screen.getAllByRole('img')
    expect(pictures).toHaveLength(titles.length)
    pictures.forEach((picture, at) => {
      expect(picture.getAttribute('aria-label')).toContain(titles[at])
      const words = document.getElementById(picture.getAttribute('aria-describedby') ?? '')
      expect(words?.textContent).toMatch(/\d/)
    })
  })

  it.each([
    ['a pump whose curve nobody recorded', shut],
    ['a kind that has none', net],
  ])('shows nothing for %s', (_, piece) => {
    const { container } = draw(piece)
    expect(container.querySelector('figure')).toBeNull()
  })
})
