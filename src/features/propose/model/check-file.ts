import { evidenceLimits } from '#shared/schemas/evidence'

const megabyte = 1024 * 1024
const { bytes: mostBytes, contentTypes } = evidenceLimits

export const acceptedTypes = contentTypes.join(',')

const isAccepted = ({ type, name }: File): boolean =>
  contentTypes.some((accepted) => accepted === type) || (type === '' && /\.(jpe?g|png|webp|pdf)$/i.test(name))

const printMegabytes = (bytes: number): string => `${Math.round((bytes / megabyte) * 10) / 10} MB`

/** Why a file is not even sent; undefined where it can be. What it really is, only the server finds out. */
export function refuseFile(file: File): string | undefined {
  if (file.size > mostBytes)
    return `“${file.name}” is ${printMegabytes(file.size)}, and a file can be up to ${printMegabytes(mostBytes)}. Nothing was sent. Choose a smaller copy: a phone’s “share as medium size” is plenty.`
  if (file.size === 0) return `“${file.name}” is empty. Nothing was sent.`
  if (!isAccepted(file)) return `“${file.name}” is neither a photo (JPEG, PNG, WebP) nor a PDF. Nothing was sent.`
  return undefined
}
