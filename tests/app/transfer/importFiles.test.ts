import { describe, expect, it } from 'vitest'
import { importFiles } from '../../../src/app/transfer/importFiles.ts'
import type { ImportState } from '../../../src/app/shelf/shelfDesk.ts'
import { emptyFormula, writeFormula } from '../../../src/formula/document.ts'
import type { Formula } from '../../../src/formula/types.ts'

const good = (name: string) => new File([writeFormula({ ...emptyFormula(), title: name })], `${name}.json`)

const broken: readonly (readonly [string, string])[] = [
  ['no JSON', '{'],
  ['another thing', '{"hello": 1}'],
  ['newer', '{"format":"evenwater.formula","version":99}'],
  ['half a formula', writeFormula(emptyFormula()).slice(0, 60)],
  [
    'a line without an amount',
    writeFormula({ ...emptyFormula(), lines: [{ key: 'a', ingredient: 'x' }] } as never),
  ],
]

function importing(files: readonly File[], cancelAfter = Infinity, isAccepted = true) {
  const cancel = new AbortController()
  const reports: ImportState[] = []
  const kept: Formula[] = []
  const outcome = importFiles(files, {
    signal: cancel.signal,
    report: (state) => reports.push(state),
    keep: async (formulas) => {
      if (isAccepted) kept.push(...formulas)
      return isAccepted
    },
    breathe: async () => {
      if ((reports.at(-1)?.done ?? 0) >= cancelAfter) cancel.abort()
    },
  })
  return { outcome, reports, kept }
}

describe('several files at once', () => {
  it('come in whole or are named one by one with the reason', async () => {
    const files = Array.from({ length: 500 }, (_, index) => {
      const [name, text] = broken[(index / 10) % broken.length] ?? []
      return index % 10 === 0 && name !== undefined && text !== undefined
        ? new File([text], `${name} ${index}.json`)
        : good(`formula ${index}`)
    })
    const { outcome, reports, kept } = importing(files)
    const { imported, refused, done, kind } = await outcome
    expect({ imported, done, kind }).toEqual({ imported: 450, done: 500, kind: 'done' })
    expect(refused).toHaveLength(50)
    expect(new Set(refused.map(({ name }) => name)).size).toBe(50)
    expect(refused.every(({ reason }) => reason.length > 20)).toBe(true)
    expect(refused.find(({ name }) => name.startsWith('newer'))?.reason).toContain('version 99')
    expect(kept.map(({ title }) => title)).not.toContain('')
    expect(kept).toHaveLength(450)
    expect(reports.filter((report) => report.kind === 'running').length).toBeGreaterThan(40)
  })

  it('put nothing on the shelf when cancelled', async () => {
    const { outcome, kept } = importing(
      Array.from({ length: 100 }, (_, index) => good(`${index}`)),
      30,
    )
    expect(await outcome).toMatchObject({ kind: 'cancelled', done: 30, imported: 0 })
    expect(kept).toEqual([])
  })

  it('do not claim to be kept when the shelf refused', async () => {
    const { outcome } = importing([good('a'), good('b')], Infinity, false)
    expect(await outcome).toMatchObject({ kind: 'done', imported: 0, refused: [] })
  })
})
