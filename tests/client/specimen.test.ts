// @vitest-environment node
import { readFile, rm } from 'node:fs/promises'
import { dirname, extname, join } from 'node:path'
import AxeBuilder from '@axe-core/playwright'
import { chromium, type Browser, type Page } from '@playwright/test'
import { afterAll, beforeAll, expect, it, vi } from 'vitest'
import { findChromium } from '../../scripts/lib/requirements.mjs'
import { buildSpecimen } from './specimen/build-specimen'

// A browser and a build: slow where other work shares the machine.
vi.setConfig({ testTimeout: 120_000 })

const origin = 'http://specimen.test'
const types: Record<string, string> = { '.html': 'text/html', '.js': 'text/javascript', '.css': 'text/css' }
const csp = "default-src 'none'; script-src 'self'; style-src 'self'; font-src 'self'; base-uri 'none'"

let folder: string
let browser: Browser

beforeAll(async () => {
  const executablePath = findChromium()
  if (executablePath === null) throw new Error('Chromium is missing on this machine.')
  folder = await buildSpecimen()
  browser = await chromium.launch({ executablePath, args: ['--no-sandbox', '--disable-gpu'] })
}, 180_000)

afterAll(async () => {
  await browser?.close()
  if (folder) await rm(dirname(folder), { recursive: true })
})

interface Visit {
  readonly width: number
  readonly colorScheme?: 'light' | 'dark'
  readonly javaScriptEnabled?: boolean
}

async function visit({ width, ...options }: Visit, look: (page: Page) => Promise<void>): Promise<void> {
  const context = await browser.newContext({ viewport: { width, height: 800 }, reducedMotion: 'reduce', ...options })
  const said: string[] = []
  context.on('console', (message) => said.push(message.text()))
  context.on('weberror', (error) => said.push(error.error().message))
  await context.route(`${origin}/**`, async (route) => {
    const { pathname } = new URL(route.request().url())
    const file = extname(pathname) ? pathname : '/index.html'
    const headers = { 'content-security-policy': csp, 'content-type': types[extname(file)] ?? 'font/woff2' }
    await route.fulfill({ body: await readFile(join(folder, file)), headers })
  })
  try {
    const page = await context.newPage()
    await page.goto(`${origin}/find`)
    await page.evaluate(() => document.fonts.ready)
    await look(page)
    expect(said).toEqual([])
  } finally {
    await context.close()
  }
}

it.each([320, 360, 768, 1280])('scrolls sideways nowhere at %d pixels (WCAG 2.2, 1.4.10 at 320)', async (width) => {
  await visit({ width }, async (page) => {
    const spare = await page.evaluate(() => document.documentElement.clientWidth - document.documentElement.scrollWidth)
    expect(spare).toBe(0)
  })
})

it.each(['light', 'dark'] as const)('passes axe in the %s theme, contrast included', async (colorScheme) => {
  await visit({ width: 1280, colorScheme }, async (page) => {
    const { violations } = await new AxeBuilder({ page })
      .withTags(['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'])
      .analyze()
    expect(violations.map(({ id, nodes }) => `${id}: ${nodes.map((node) => node.html).join(' ')}`)).toEqual([])
  })
})

it('moves nothing on the page when the drawings are laid out for their true width', async () => {
  const heights = async (page: Page) =>
    page.locator('figure').evaluateAll((figures) => figures.map((figure) => figure.getBoundingClientRect().height))
  for (const width of [360, 1280]) {
    let before: number[] = []
    await visit({ width, javaScriptEnabled: false }, async (page) => void (before = await heights(page)))
    await visit({ width }, async (page) => {
      await page.waitForFunction(() => {
        const drawing = document.querySelector('figure svg[role]')
        const drawn = Number(drawing?.getAttribute('viewBox')?.split(' ')[2])
        return Math.abs(drawn - (drawing?.getBoundingClientRect().width ?? 0)) < 1
      })
      const after = await heights(page)
      expect(after).toHaveLength(before.length)
      after.forEach((height, at) => expect(Math.abs(height - before[at]!)).toBeLessThanOrEqual(1))
    })
  }
})

it('keeps drawn text at 11 pixels or more on a phone', async () => {
  await visit({ width: 360 }, async (page) => {
    const sizes = await page.locator('svg text').evaluateAll((texts) =>
      texts.map((text) => {
        const matrix = (text as SVGTextElement).getScreenCTM()
        return parseFloat(getComputedStyle(text).fontSize) * (matrix?.a ?? 0)
      }),
    )
    expect(sizes.length).toBeGreaterThan(40)
    expect(Math.min(...sizes)).toBeGreaterThanOrEqual(10.9)
  })
})

it.each([360, 1280])('lays no label of the plan or section on another, at %d pixels in both units', async (width) => {
  await visit({ width }, async (page) => {
    for (const units of ['mm · L', 'in · gal']) {
      await page.getByRole('button', { name: units }).click()
      const clashes = await page.locator('figure').evaluateAll((figures) =>
        figures.flatMap((figure) => {
          const texts = [...figure.querySelectorAll('svg text')].filter((text) => text.textContent)
          const boxes = texts.map((text) => text.getBoundingClientRect())
          return boxes.flatMap((a, i) =>
            boxes.slice(i + 1).flatMap((b, j) => {
              const across = Math.min(a.right, b.right) - Math.max(a.left, b.left)
              const down = Math.min(a.bottom, b.bottom) - Math.max(a.top, b.top)
              // A line's box is taller than its letters by about two pixels on either side.
              return across > 1 && down > 4 ? [`${texts[i]?.textContent} / ${texts[i + 1 + j]?.textContent}`] : []
            }),
          )
        }),
      )
      expect(await page.locator('figure svg text').count()).toBeGreaterThan(40)
      expect(clashes).toEqual([])
    }
  })
})

it('gives every drawn dimension at least 24 by 24 pixels on a phone (WCAG 2.2, 2.5.8)', async () => {
  await visit({ width: 360 }, async (page) => {
    const sizes = await page.locator('[data-path]').evaluateAll((targets) =>
      targets.map((target) => {
        const { width, height } = target.getBoundingClientRect()
        return Math.min(width, height)
      }),
    )
    expect(sizes.length).toBeGreaterThan(20)
    expect(Math.min(...sizes)).toBeGreaterThanOrEqual(24)
  })
})

it('opens a dimension from the keyboard, takes its measure, and gives the focus back', async () => {
  await visit({ width: 360 }, async (page) => {
    const target = page.locator('[data-tank="0"] [data-path="tank.outerLengthMm"]')
    await target.focus()
    await page.keyboard.press('Space')
    const dialog = page.getByRole('dialog', { name: 'Type a measure' })
    await page.keyboard.type('24 in')
    expect(await dialog.getByRole('textbox').inputValue()).toBe('24 in')
    await page.keyboard.press('Escape')
    await dialog.waitFor({ state: 'detached' })
    expect(await page.evaluate(() => document.activeElement?.getAttribute('data-path'))).toBe('tank.outerLengthMm')
  })
})

it('walks a shared scale by arrow keys and names the mark', async () => {
  await visit({ width: 1280 }, async (page) => {
    const scale = page.getByRole('listbox', { name: /^Length in water/ })
    await scale.focus()
    await page.keyboard.press('End')
    const active = await scale.getAttribute('aria-activedescendant')
    const option = page.locator(`[id="${active}"]`)
    expect(await option.getAttribute('aria-selected')).toBe('true')
    expect(await option.getAttribute('aria-label')).toMatch(/^Marlin & Fenn Stoker \d+, 13\.\d\sin, does not fit$/)
    // The same piece lights up on the other scale too.
    expect(await page.locator('[role="option"][aria-selected="true"]').count()).toBe(2)
  })
})

it('picks marks by pressing on them, each of a pile in turn', async () => {
  await visit({ width: 360 }, async (page) => {
    const power = page.getByRole('listbox', { name: /^Power/ })
    await power.scrollIntoViewIfNeeded()
    const heads = await power.locator('[role="option"]').all()
    const picked = new Set<string>()
    for (const head of heads.slice(8, 14)) {
      const box = (await head.boundingBox())!
      for (let press = 0; press < 3; press++) {
        await page.mouse.click(box.x + box.width / 2, box.y + 4)
        picked.add((await power.getAttribute('aria-activedescendant')) ?? '')
      }
    }
    expect(picked.size).toBeGreaterThanOrEqual(6)
  })
})

it('takes focus to the error summary, and from there to the field', async () => {
  await visit({ width: 360 }, async (page) => {
    await page.getByRole('button', { name: 'Answer', exact: true }).click()
    expect(await page.evaluate(() => document.activeElement?.getAttribute('role'))).toBe('alert')
    await page.getByRole('alert').getByRole('link').click()
    expect(await page.evaluate(() => document.activeElement?.id)).toBe('depth')
  })
})

it('changes the theme at once, and lets the system decide again', async () => {
  await visit({ width: 360, colorScheme: 'light' }, async (page) => {
    const ground = () => page.evaluate(() => getComputedStyle(document.documentElement).backgroundColor)
    const light = await ground()
    await page.getByRole('button', { name: 'Dark water' }).click()
    expect(await ground()).not.toBe(light)
    await page.getByRole('button', { name: /as the system/ }).click()
    expect(await ground()).toBe(light)
  })
})

it('rings every control that takes focus with the action colour', async () => {
  await visit({ width: 1280, colorScheme: 'light' }, async (page) => {
    for (let step = 0; step < 14; step++) {
      await page.keyboard.press('Tab')
      const ring = await page.evaluate(() => {
        const element = document.activeElement
        if (!element || element === document.body) return 'no focus'
        const drawn = element.querySelector(':scope > rect')
        if (drawn) return getComputedStyle(drawn).stroke
        const { outlineStyle, outlineWidth, outlineColor } = getComputedStyle(element)
        return outlineStyle === 'solid' && parseFloat(outlineWidth) >= 2 ? outlineColor : 'no outline'
      })
      // #2447c6, whose contrast to every ground is checked in styles/contrast.test.ts.
      expect(ring).toBe('rgb(36, 71, 198)')
    }
  })
})
