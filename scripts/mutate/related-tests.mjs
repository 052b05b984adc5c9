import { existsSync, readFileSync } from 'node:fs'
import { dirname, join, relative } from 'node:path'
import ts from 'typescript'

/**
 * Which tests reach a file, and over how many imports.
 * @typedef {{ test: string, steps: number }} Related
 */

function resolveImport(/** @type {string} */ root, /** @type {string} */ from, /** @type {string} */ name) {
  const base = name.startsWith('#shared/')
    ? join(root, 'shared', name.slice('#shared/'.length))
    : name.startsWith('.')
      ? join(root, dirname(from), name)
      : null
  if (base === null) return null
  const found = [base, `${base}.ts`, `${base}.tsx`, `${base}/index.ts`].find(
    (path) => /\.tsx?$/.test(path) && existsSync(path),
  )
  return found === undefined ? null : relative(root, found)
}

/** Follows imports through the tree, each file read once. */
export class ImportGraph {
  /** @type {Map<string, readonly string[]>} */
  #imports = new Map()

  /** @param {string} root */
  constructor(root) {
    this.root = root
  }

  /** @returns {readonly string[]} */
  importsOf(/** @type {string} */ file) {
    let known = this.#imports.get(file)
    if (!known) {
      const { importedFiles } = ts.preProcessFile(readFileSync(join(this.root, file), 'utf8'))
      known = importedFiles.flatMap(({ fileName }) => resolveImport(this.root, file, fileName) ?? [])
      this.#imports.set(file, known)
    }
    return known
  }

  /**
   * Files that one reaches, with the fewest imports to each.
   * @returns {ReadonlyMap<string, number>}
   */
  reach(/** @type {string} */ file) {
    const steps = new Map([[file, 0]])
    let edge = [file]
    for (let step = 1; edge.length > 0; step += 1) {
      edge = edge.flatMap((one) => this.importsOf(one)).filter((one) => !steps.has(one))
      edge = [...new Set(edge)]
      for (const one of edge) steps.set(one, step)
    }
    return steps
  }
}

const nameOf = (/** @type {string} */ path) => (path.split('/').at(-1) ?? '').replace(/\.test$|(\.test)?\.tsx?$/, '')

/**
 * The tests of each file, those most likely to notice first: of the same name, then the nearest by import.
 * @param {ImportGraph} graph
 * @param {readonly string[]} tests
 * @returns {(file: string) => readonly string[]}
 */
export function relateTests(graph, tests) {
  const reaches = tests.map((test) => ({ test, reach: graph.reach(test) }))
  return (file) => {
    const weigh = (/** @type {Related} */ { test, steps }) => (nameOf(test) === nameOf(file) ? 0 : steps)
    return reaches
      .flatMap(({ test, reach }) => {
        const steps = reach.get(file)
        return steps === undefined ? [] : [{ test, steps }]
      })
      .sort((a, b) => weigh(a) - weigh(b) || (a.test < b.test ? -1 : 1))
      .map(({ test }) => test)
  }
}
