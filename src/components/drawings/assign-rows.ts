/** The first row in which each stretch overlaps none before it. */
export function assignRows(stretches: readonly (readonly [number, number])[]): readonly number[] {
  const rows: (readonly [number, number])[][] = []
  return stretches.map((stretch) => {
    const isFree = (row: (readonly [number, number])[]) =>
      row.every(([from, to]) => stretch[1] <= from || stretch[0] >= to)
    const at = rows.findIndex(isFree)
    const row = at >= 0 ? at : rows.push([]) - 1
    rows[row]?.push(stretch)
    return row
  })
}
