import { readFileSync } from 'node:fs'

/** Rows of a comma-separated table beside a test, by column name. Quoted cells may hold commas. */
export function rowsOf(url: URL): readonly Readonly<Record<string, string>>[] {
  const [head, ...lines] = readFileSync(url, 'utf8').trim().split(/\r?\n/)
  const names = cellsOf(head ?? '')
  return lines.map((line) => {
    const cells = cellsOf(line)
    return Object.fromEntries(names.map((name, index) => [name, cells[index] ?? '']))
  })
}

function cellsOf(line: string): readonly string[] {
  return [...line.matchAll(/("(?:[^"]|"")*"|[^,]*)(?:,|$)/g)]
    .slice(0, -1)
    .concat()
    .map(([, cell = '']) => (cell.startsWith('"') ? cell.slice(1, -1).replaceAll('""', '"') : cell))
}
