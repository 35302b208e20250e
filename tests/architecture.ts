import { posix } from 'node:path'
import ts from 'typescript'

/** Each room may import only from itself and those before it. */
export const rooms = [
  'quantity',
  'numeric',
  'library',
  'chemistry',
  'formula',
  'evaluation',
  'worksheet',
  'app',
] as const

/* Narrower than the order of the rooms. */
const allowed: Record<string, readonly string[]> = {
  quantity: [],
  numeric: ['quantity'],
  library: ['quantity'],
  chemistry: ['quantity', 'numeric', 'library'],
  formula: ['quantity', 'library'],
  evaluation: ['quantity', 'numeric', 'library', 'chemistry', 'formula'],
  worksheet: ['quantity', 'library', 'formula', 'evaluation'],
  app: ['quantity', 'numeric', 'library', 'chemistry', 'formula', 'evaluation', 'worksheet'],
}

const packages: Record<string, readonly string[]> = {
  quantity: ['mathjs'],
  numeric: ['mathjs'],
  library: ['valibot'],
  formula: ['valibot'],
}

const impureNames = new Set([
  'Date',
  'console',
  'window',
  'document',
  'navigator',
  'localStorage',
  'indexedDB',
  'fetch',
  'process',
  'performance',
  'setTimeout',
  'setInterval',
  'requestAnimationFrame',
])

const fileCap = 400
const functionCap = 60

export interface SourceFile {
  readonly path: string
  readonly text: string
}

const roomOf = (path: string) => /^src\/([^/]+)\//.exec(path)?.[1]

function importBreach(file: SourceFile, specifier: string): string[] {
  const room = roomOf(file.path)
  if (!room || room === 'app') return []
  if (!specifier.startsWith('.')) {
    if ((packages[room] ?? []).includes(specifier)) return []
    return [`${file.path}: ${room} may not import the package ${specifier}`]
  }
  const target = posix.join(posix.dirname(file.path), specifier)
  if (target.startsWith('data/'))
    return room === 'library' ? [] : [`${file.path}: only the library reads ${target}`]
  const other = roomOf(target)
  if (!other) return [`${file.path}: import of ${specifier} leaves src`]
  if (other === room || (allowed[room] ?? []).includes(other)) return []
  return [`${file.path}: ${room} may not import from ${other} (${specifier})`]
}

function specifierOf(node: ts.Node): string | undefined {
  const literal = (expression?: ts.Node) =>
    expression && ts.isStringLiteralLike(expression) ? expression.text : undefined
  if (ts.isImportDeclaration(node) || ts.isExportDeclaration(node)) return literal(node.moduleSpecifier)
  if (ts.isImportTypeNode(node) && ts.isLiteralTypeNode(node.argument)) return literal(node.argument.literal)
  if (ts.isCallExpression(node) && node.expression.kind === ts.SyntaxKind.ImportKeyword) {
    return literal(node.arguments[0])
  }
  return undefined
}

/** Names of types that `brand.ts` defines, so that `as Grams` is seen. */
const isBrand = (name: string) =>
  /^(Grams|Millilitres|Millimoles|Milliequivalents|MolesPer|MillimolesPer|GramsPer|Milliosmoles|KilogramsPer|KelvinD|DegreesC|Percent|Fraction$|PH$|Scalar$)/.test(
    name,
  )

function impurity(file: SourceFile, node: ts.Node, source: ts.SourceFile): string[] {
  const room = roomOf(file.path)
  if (!room || room === 'app') return []
  if (ts.isPropertyAccessExpression(node) && node.getText(source) === 'Math.random') {
    return [`${file.path}: Math.random outside app`]
  }
  const isName = ts.isIdentifier(node) && impureNames.has(node.text)
  if (isName && isFreeName(node)) return [`${file.path}: ${node.text} outside app`]
  if (
    ts.isAsExpression(node) &&
    ts.isTypeReferenceNode(node.type) &&
    isBrand(node.type.typeName.getText(source)) &&
    file.path !== 'src/quantity/mint.ts'
  ) {
    return [`${file.path}: cast to the brand ${node.type.getText(source)} outside mint.ts`]
  }
  return []
}

/** A name used as a value of its own, not a property, a key or a declaration. */
function isFreeName(node: ts.Identifier): boolean {
  const parent = node.parent
  if (ts.isPropertyAccessExpression(parent)) return parent.expression === node
  if (ts.isPropertyAssignment(parent)) return parent.initializer === node
  return ts.isCallExpression(parent) || ts.isNewExpression(parent)
}

function functionBreach(file: SourceFile, node: ts.Node, source: ts.SourceFile): string[] {
  if (!ts.isFunctionLike(node) || !('body' in node) || !node.body) return []
  const first = source.getLineAndCharacterOfPosition(node.getStart(source)).line
  const last = source.getLineAndCharacterOfPosition(node.end).line
  const count = last - first + 1
  if (count <= functionCap) return []
  return [`${file.path}:${first + 1}: function of ${count} lines (cap ${functionCap})`]
}

/** Every way in which one file leaves the rules of the house. */
export function breaches(file: SourceFile): string[] {
  const source = ts.createSourceFile(file.path, file.text, ts.ScriptTarget.ES2022, true)
  const found: string[] = []
  const count = file.text.replace(/\n$/, '').split('\n').length
  if (count > fileCap) found.push(`${file.path}: ${count} lines (cap ${fileCap})`)
  const visit = (node: ts.Node) => {
    const specifier = specifierOf(node)
    if (specifier !== undefined) found.push(...importBreach(file, specifier))
    found.push(...impurity(file, node, source), ...functionBreach(file, node, source))
    ts.forEachChild(node, visit)
  }
  visit(source)
  return found
}
