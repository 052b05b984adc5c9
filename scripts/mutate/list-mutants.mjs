import ts from 'typescript'

/**
 * One small fault: the text from `start` to `end` replaced.
 * @typedef {'arithmetic' | 'comparison' | 'boundary' | 'constant' | 'logical' | 'return'} Operator
 * @typedef {object} Mutant
 * @property {string} file
 * @property {number} line
 * @property {Operator} operator
 * @property {number} start
 * @property {number} end
 * @property {string} was
 * @property {string} becomes
 */

const { SyntaxKind } = ts

/** @type {Readonly<Record<number, readonly (readonly [Operator, string])[]>>} */
const swaps = {
  [SyntaxKind.PlusToken]: [['arithmetic', '-']],
  [SyntaxKind.MinusToken]: [['arithmetic', '+']],
  [SyntaxKind.AsteriskToken]: [['arithmetic', '/']],
  [SyntaxKind.SlashToken]: [['arithmetic', '*']],
  [SyntaxKind.AsteriskAsteriskToken]: [['arithmetic', '*']],
  [SyntaxKind.PlusEqualsToken]: [['arithmetic', '-=']],
  [SyntaxKind.MinusEqualsToken]: [['arithmetic', '+=']],
  [SyntaxKind.AsteriskEqualsToken]: [['arithmetic', '/=']],
  [SyntaxKind.LessThanToken]: [
    ['boundary', '<='],
    ['comparison', '>='],
  ],
  [SyntaxKind.LessThanEqualsToken]: [
    ['boundary', '<'],
    ['comparison', '>'],
  ],
  [SyntaxKind.GreaterThanToken]: [
    ['boundary', '>='],
    ['comparison', '<='],
  ],
  [SyntaxKind.GreaterThanEqualsToken]: [
    ['boundary', '>'],
    ['comparison', '<'],
  ],
  [SyntaxKind.EqualsEqualsEqualsToken]: [['comparison', '!==']],
  [SyntaxKind.ExclamationEqualsEqualsToken]: [['comparison', '===']],
  [SyntaxKind.AmpersandAmpersandToken]: [['logical', '||']],
  [SyntaxKind.BarBarToken]: [['logical', '&&']],
}

const isText = (/** @type {ts.Node} */ node) =>
  ts.isStringLiteral(node) || ts.isTemplateExpression(node) || ts.isNoSubstitutionTemplateLiteral(node)

/** A number's neighbour: what is 0 becomes 1, what is not becomes a tenth more, or one more where it counts. */
function nudge(/** @type {string} */ text) {
  const value = Number(text.replaceAll('_', ''))
  if (!Number.isFinite(value)) return null
  if (Number.isInteger(value) && Math.abs(value) < 10) return String(value + 1)
  return String(Number((value * 1.1).toPrecision(12)))
}

/**
 * Every mutant of a file, in the order of its text. Types, imports and what is only printed are left alone.
 * @param {string} file
 * @param {string} text
 * @returns {Mutant[]}
 */
export function listMutants(file, text) {
  const source = ts.createSourceFile(file, text, ts.ScriptTarget.Latest, true)
  /** @type {Mutant[]} */
  const found = []
  const add = (/** @type {Operator} */ operator, /** @type {ts.Node} */ node, /** @type {string} */ becomes) => {
    const start = node.getStart(source)
    const line = source.getLineAndCharacterOfPosition(start).line + 1
    found.push({ file, line, operator, start, end: node.end, was: text.slice(start, node.end), becomes })
  }
  const visit = (/** @type {ts.Node} */ node) => {
    if (ts.isTypeNode(node) || ts.isImportDeclaration(node) || ts.isExportDeclaration(node)) return
    if (ts.isTypeAliasDeclaration(node) || ts.isInterfaceDeclaration(node)) return
    // Words are read by people; that sentences read well has tests of its own.
    if (ts.isTemplateExpression(node)) return
    if (ts.isBinaryExpression(node) && !isText(node.left) && !isText(node.right))
      for (const [operator, becomes] of swaps[node.operatorToken.kind] ?? []) add(operator, node.operatorToken, becomes)
    if (ts.isNumericLiteral(node) && !ts.isLiteralTypeNode(node.parent)) {
      const becomes = nudge(node.text)
      if (becomes !== null && becomes !== node.text) add('constant', node, becomes)
    }
    if (node.kind === SyntaxKind.TrueKeyword) add('constant', node, 'false')
    if (node.kind === SyntaxKind.FalseKeyword) add('constant', node, 'true')
    if (ts.isPrefixUnaryExpression(node) && node.operator === SyntaxKind.ExclamationToken)
      add('logical', node, `(${node.operand.getText(source)})`)
    if (ts.isConditionalExpression(node)) add('logical', node.condition, `!(${node.condition.getText(source)})`)
    if (ts.isIfStatement(node)) add('logical', node.expression, `!(${node.expression.getText(source)})`)
    if (ts.isReturnStatement(node) && node.expression && node.expression.kind !== SyntaxKind.NullKeyword)
      if (node.expression.getText(source) !== 'undefined') add('return', node.expression, 'undefined')
    ts.forEachChild(node, visit)
  }
  visit(source)
  return found.sort((a, b) => a.start - b.start || (a.becomes < b.becomes ? -1 : 1))
}

/** The text of the file with the fault in it. */
export const applyMutant = (/** @type {string} */ text, /** @type {Mutant} */ { start, end, becomes }) =>
  text.slice(0, start) + becomes + text.slice(end)
