import sharp from 'sharp'
import { evidenceLimits } from '#shared/schemas/evidence'
import { createInvalidError } from '../../lib/errors'

const longestSide = 4096
const thumbnailSide = 480

// Each photo is looked at once, so keeping decoded ones would only cost memory.
sharp.cache(false)

export interface PreparedPhoto {
  readonly content: Buffer
  readonly width: number
  readonly height: number
  readonly thumbnail: Buffer
}

const refuse = (detail: string): never => {
  throw createInvalidError([{ pointer: '#/file', detail }])
}

/** From the head of the file alone: a small file can claim a picture that fills the memory. */
async function checkSize(content: Buffer): Promise<void> {
  const { width = 0, height = 0 } = await sharp(content, { limitInputPixels: false })
    .metadata()
    .catch(() => refuse('cannot be read as a picture'))
  const megapixels = Math.round((width * height) / 1e6)
  if (width * height > evidenceLimits.pixels) {
    refuse(
      `has ${megapixels} megapixels; ${evidenceLimits.pixels / 1e6} are the most: make it smaller and choose it again`,
    )
  }
}

let working: Promise<unknown> = Promise.resolve()

/** One photo at a time: each takes hundreds of megabytes for a moment. */
function takeTurn<T>(work: () => Promise<T>): Promise<T> {
  const turn = working.then(work, work)
  working = turn.catch(() => undefined)
  return turn
}

/**
 * The picture alone, drawn anew: upright, in sRGB, without what the camera wrote beside it (where it stood, its owner's
 * name, a small copy of the uncropped picture).
 */
async function encode(content: Buffer, format: 'jpeg' | 'png' | 'webp'): Promise<PreparedPhoto> {
  const upright = sharp(content, { limitInputPixels: evidenceLimits.pixels, failOn: 'error' }).autoOrient()
  const fit = { fit: 'inside', withoutEnlargement: true } as const
  const { data, info } = await upright
    .clone()
    .resize({ width: longestSide, height: longestSide, ...fit })
    .toFormat(format, { quality: 85 })
    .toBuffer({ resolveWithObject: true })
  const thumbnail = await sharp(data)
    .resize({ width: thumbnailSide, height: thumbnailSide, ...fit })
    .webp()
    .toBuffer()
  return { content: data, width: info.width, height: info.height, thumbnail }
}

export async function preparePhoto(content: Buffer, format: 'jpeg' | 'png' | 'webp'): Promise<PreparedPhoto> {
  await checkSize(content)
  return takeTurn(() => encode(content, format)).catch(() => refuse('cannot be read as a picture'))
}
