import { act, renderHook } from '@testing-library/react'
import { afterEach, describe, expect, it, vi } from 'vitest'
import { keepLastSetup, useLastSetup } from '../../../src/lib/last-setup'

afterEach(() => {
  localStorage.clear()
  vi.restoreAllMocks()
})

describe('the setup that somebody last described', () => {
  it('is remembered, and an address without one does not make it forgotten', () => {
    keepLastSetup('tank.volumeL=20%20gal')
    keepLastSetup('')
    expect(renderHook(useLastSetup).result.current).toBe('tank.volumeL=20%20gal')
  })

  it('follows another tab', () => {
    const { result } = renderHook(useLastSetup)
    expect(result.current).toBeNull()
    act(() => {
      keepLastSetup('tank.volumeL=40%20gal')
      window.dispatchEvent(new StorageEvent('storage'))
    })
    expect(result.current).toBe('tank.volumeL=40%20gal')
  })

  it('is simply not remembered where storage is forbidden', () => {
    const forbid = () => {
      throw new DOMException('forbidden', 'SecurityError')
    }
    vi.spyOn(Storage.prototype, 'setItem').mockImplementation(forbid)
    vi.spyOn(Storage.prototype, 'getItem').mockImplementation(forbid)
    keepLastSetup('tank.volumeL=20%20gal')
    expect(renderHook(useLastSetup).result.current).toBeNull()
  })
})
