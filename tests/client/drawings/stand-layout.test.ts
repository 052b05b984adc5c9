import { describe, expect, it } from 'vitest'
import { findCommon, findStubMm, layoutStand, standSheet } from '../../../src/components/drawings/stand-layout'

const top = { lengthMm: 616, widthMm: 463 }
const tank = { lengthMm: 589, widthMm: 399, heightMm: 399 }

describe('a stand laid out', () => {
  it.each([280, 360, 768, 1280])('keeps top and tank between the dimensions of a sheet %d px wide', (widthPx) => {
    const { pxPerMm, middleX, floorPx } = layoutStand({ top, tank }, widthPx)
    const half = (top.lengthMm / 2) * pxPerMm
    expect(middleX - half).toBeGreaterThanOrEqual(standSheet.sidesPx[0])
    expect(middleX + half).toBeLessThanOrEqual(widthPx - standSheet.sidesPx[1])
    const frontMm = tank.heightMm + findStubMm(tank)
    expect(floorPx - frontMm * pxPerMm).toBeGreaterThanOrEqual(standSheet.abovePx - 1e-9)
  })

  it('reserves the height that it draws, at any width', () => {
    for (const widthPx of [300, 500, 900]) {
      const { heightPx, size } = layoutStand({ top, tank }, widthPx)
      const roomPx = widthPx - standSheet.sidesPx[0] - standSheet.sidesPx[1]
      const reserved = (Math.min(size.acrossPx, roomPx) / size.acrossPx) * size.contentPx
      expect(heightPx).toBeCloseTo(size.abovePx + reserved + size.belowPx, 6)
    }
  })

  it('finds where two rectangles lie on each other', () => {
    const board = { x: 0, y: 10, width: 100, height: 20 }
    const glass = { x: 20, y: 0, width: 60, height: 40 }
    expect(findCommon(board, glass)).toEqual({ x: 20, y: 10, width: 60, height: 20 })
  })
})
