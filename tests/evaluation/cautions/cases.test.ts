import { describe, expect, it } from 'vitest'
import { judge } from '../../../src/evaluation/cautions/condition.ts'
import { raiseCautions } from '../../../src/evaluation/cautions/raise.ts'
import { tellFinding } from '../../../src/worksheet/tell.ts'
import { cases } from './cases/all.ts'
import { meetings } from './cases/meetings.ts'
import { contextOf, library, silenced, type Situation } from './contexts.ts'

const cautionOf = (id: string) => {
  const caution = library.cautions.find((candidate) => candidate.id === id)
  if (!caution) throw new Error(`no caution ${id}`)
  return caution
}

/** This caution alone, so that no louder one hides it. */
const raised = (id: string, situation: Situation) =>
  raiseCautions(contextOf(situation), [cautionOf(id)]).filter(({ code }) => code === id)

describe('every caution', () => {
  it('has exactly one case', () => {
    expect(cases.map(([id]) => id).sort()).toEqual(library.cautions.map(({ id }) => id).sort())
  })

  it.each(cases)('%s speaks, in full words', (id, fires) => {
    const [finding] = raised(id, fires)
    expect(finding).toMatchObject({
      severity: cautionOf(id).severity,
      source: cautionOf(id).source,
      blocks: false,
    })
    if (!finding) return
    const { message, wayOut } = tellFinding(finding, library)
    expect(`${message} ${wayOut}`).not.toMatch(/[{}]|undefined|null|NaN|not known/)
  })

  it.each(cases)('%s is silent a step outside', (...row) => {
    expect(raised(row[0], silenced(row))).toEqual([])
  })

  it('is not silent for want of a figure in its case', () => {
    const open = cases.filter(
      (row) => judge(cautionOf(row[0]).when, contextOf(silenced(row))).truth !== false,
    )
    expect(open.map(([id]) => id)).toEqual([])
  })
})

describe('a caution that yields', () => {
  const situations = [...cases.map(([, fires]) => fires), ...meetings]

  it.each(
    library.cautions.flatMap(({ id, yieldsTo = [] }) => yieldsTo.map((louder) => [id, louder] as const)),
  )('%s leaves the word to %s where both hold', (id, louder) => {
    const both = situations.filter((situation) => {
      const context = contextOf(situation)
      return [id, louder].every((each) => judge(cautionOf(each).when, context).truth === true)
    })
    expect(both.length).toBeGreaterThan(0)
    const [situation = {}] = both
    expect(raiseCautions(contextOf(situation)).map(({ code }) => code)).not.toContain(id)
  })
})
