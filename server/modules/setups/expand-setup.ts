import type { Item, Piece, Setup, TankInput } from '#shared/engine/types'
import type { ItemParsed, SetupParsed } from '#shared/schemas/setup'
import type { PieceRequest } from '#shared/schemas/piece-input'
import { toSpecs } from '#shared/schemas/specs'
import type { TankRequest } from '#shared/schemas/tank-input'
import type { Issue } from '../../lib/errors'
import { toPointer } from '../../lib/to-issues'
import type { Snapshot } from '../catalogue/build-snapshot'

type Path = readonly PropertyKey[]
type Complain = (path: Path, detail: string) => void

/** What the engine reads, and every slug that names nothing. Only without issues is `expanded` whole. */
export interface Expanded<T> {
  readonly expanded: T
  readonly issues: readonly Issue[]
}

const nothing: Piece = { kind: 'net', specs: {} }

function expandPiece(snapshot: Snapshot, request: PieceRequest, path: Path, complain: Complain): Piece {
  const { kind, gear, specs } = request
  if (gear === undefined) return kind === undefined ? nothing : { kind, specs: toSpecs(kind, specs ?? {}, 'maker') }
  const piece = snapshot.bySlug.get(gear)
  if (piece === undefined) {
    complain([...path, 'gear'], `there is no piece of gear called "${gear}"`)
    return nothing
  }
  if (kind !== undefined && kind !== piece.kind) complain([...path, 'kind'], `"${gear}" is of the kind ${piece.kind}`)
  return piece
}

function expandTank(snapshot: Snapshot, request: TankRequest, complain: Complain): TankInput {
  const { gear, volumeL, ...given } = request
  const own = toSpecs('tank', given, 'measured')
  const volume = volumeL === undefined ? {} : { volumeL }
  if (gear === undefined) return { specs: own, ...volume }
  const piece = snapshot.bySlug.get(gear)
  if (piece?.kind !== 'tank') {
    complain(['setup', 'tank', 'gear'], `there is no tank called "${gear}"`)
    return { specs: own, ...volume }
  }
  return { specs: { ...piece.specs, ...own }, ...(piece.gear && { gear: piece.gear }), ...volume }
}

/** Size enough to compute with: the three outside measures, or a volume. */
function hasSize({ specs, volumeL }: TankInput): boolean {
  if (volumeL !== undefined || specs.nominalVolumeL !== undefined) return true
  return ['outerLengthMm', 'outerWidthMm', 'outerHeightMm'].every((key) => specs[key] !== undefined)
}

function expandItem(snapshot: Snapshot, request: ItemParsed, path: Path, complain: Complain): Item {
  const { id, quantity, state, place, mountHeightMm } = request
  return {
    id,
    piece: expandPiece(snapshot, request, path, complain),
    quantity,
    state,
    ...(place !== undefined && { place }),
    ...(mountHeightMm !== undefined && { mountHeightMm }),
  }
}

function createCollector(): { readonly issues: Issue[]; readonly complain: Complain } {
  const issues: Issue[] = []
  return { issues, complain: (path, detail) => void issues.push({ pointer: toPointer(path), detail }) }
}

/** Replaces slugs by what the catalogue says; a tank's own figures go before the catalogue's. */
export function expandSetup(snapshot: Snapshot, parsed: SetupParsed): Expanded<Setup> {
  const { issues, complain } = createCollector()
  const { tank: tankRequest, items: itemRequests, ...rest } = parsed
  const tank = expandTank(snapshot, tankRequest, complain)
  if (issues.length === 0 && !hasSize(tank)) {
    complain(['setup', 'tank'], 'needs its outside length, width and height, or a volume')
  }
  const items = itemRequests.map((item, index) => expandItem(snapshot, item, ['setup', 'items', index], complain))
  return { expanded: { ...(rest as Omit<Setup, 'tank' | 'items'>), tank, items }, issues }
}

export function expandJudgedPiece(snapshot: Snapshot, request: PieceRequest): Expanded<Piece> {
  const { issues, complain } = createCollector()
  return { expanded: expandPiece(snapshot, request, ['piece'], complain), issues }
}
