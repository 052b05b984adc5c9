import sharp from 'sharp'

const create = (width: number, height: number) =>
  sharp({ create: { width, height, channels: 3, background: { r: 30, g: 90, b: 120 } } })

export const createJpeg = (width = 64, height = 48) => create(width, height).jpeg().toBuffer()
export const createPng = (width = 64, height = 48) => create(width, height).png().toBuffer()
export const createWebp = () => create(64, 48).webp().toBuffer()

/** Taken at a place, by somebody, turned on its side. */
export const createGpsJpeg = () =>
  create(80, 40)
    .jpeg()
    .withExif({
      IFD0: { Artist: 'Somebody Invented', Orientation: '6' },
      IFD3: { GPSLatitudeRef: 'N', GPSLatitude: '51/1 30/1 0/1', GPSLongitudeRef: 'W', GPSLongitude: '0/1 7/1 0/1' },
    })
    .withMetadata({ orientation: 6 })
    .toBuffer()

export const createPdf = (inside = '') =>
  Buffer.from(
    `%PDF-1.4\n${inside}1 0 obj<</Type/Catalog/Pages 2 0 R>>endobj\n2 0 obj<</Type/Pages/Count 0/Kids[]>>endobj\n` +
      'trailer<</Root 1 0 R>>\n%%EOF\n',
  )
