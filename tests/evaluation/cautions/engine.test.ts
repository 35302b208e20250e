import { describe, expect, it } from 'vitest'
import { evaluate } from '../../../src/evaluation/evaluate.ts'
import type { Formula, PatientData } from '../../../src/formula/types.ts'
import { cases } from './cases/all.ts'
import { engineCases, type Ordered } from './cases/engine.ts'
import { library, ownRecord, silenced, type Situation } from './contexts.ts'

/* Every caution once more, from what a person types to what the evaluation says. */

const found = ['osmolality', 'effective', 'osmolarity', 'equivalent', 'capacity']

function patientOf({
  ageYears,
  weightKg,
  doseVolumeMl,
  infusionRateMlPerH,
}: NonNullable<Situation['patient']>) {
  const patient: PatientData = {
    ...(ageYears === undefined ? {} : { ageYears }),
    ...(weightKg === undefined ? {} : { weightKg }),
    ...(doseVolumeMl === undefined ? {} : { doseVolume: `${doseVolumeMl} mL` }),
    ...(infusionRateMlPerH === undefined ? {} : { infusionRate: `${infusionRateMlPerH} mL/h` }),
  }
  return patient
}

const formulaOf = ({ route, lines, pH, volumeMl, patient, target }: Ordered): Formula => ({
  format: 'evenwater.formula',
  version: 1,
  title: 'As typed',
  route: route ?? 'ophthalmic',
  finalVolume: `${volumeMl ?? 1000} mL`,
  ...(pH === null ? {} : { pH: pH ?? 7.2 }),
  ...(patient ? { patient: patientOf(patient) } : {}),
  ...(target ? { target } : {}),
  lines: Object.entries(lines ?? { 'sodium-chloride': '0.9 %' }).map(([id, amount], index) => ({
    key: `line-${index + 1}`,
    ingredient: library.ingredients.has(id) ? id : ownRecord(id),
    amount,
  })),
})

const rows = cases.map((row): readonly [string, Ordered, Ordered] => {
  const own = engineCases[row[0]]
  return own ? [row[0], ...own] : [row[0], row[1], silenced(row)]
})

const evaluated = (ordered: Ordered) => evaluate(formulaOf(ordered), library)

describe('every caution, through the whole evaluation', () => {
  it('takes figures of the solution from the engine, never from its case', () => {
    const injected = rows.filter((row) =>
      row.slice(1).some((ordered) => found.some((figure) => figure in (ordered as object))),
    )
    expect(injected.map(([id]) => id)).toEqual([])
    const ids = new Set(library.cautions.map(({ id }) => id))
    expect(Object.keys(engineCases).filter((id) => !ids.has(id))).toEqual([])
    expect(rows.map(([id]) => id).toSorted()).toEqual([...ids].toSorted())
  })

  it.each(rows)('%s speaks', (id, fires) => {
    const caution = library.cautions.find((each) => each.id === id)
    const finding = evaluated(fires).findings.find(({ code }) => code === id)
    expect(finding?.severity).toBe(caution?.severity)
    expect(finding?.evidence).toBe(caution?.evidence)
  })

  it.each(rows)('%s is silent a step outside, and not because the formula failed', (id, fires, silent) => {
    const outside = evaluated(silent)
    expect(outside.findings.filter(({ code }) => code === id)).toEqual([])
    if (outside.status === 'blocked') expect(evaluated(fires).status).toBe('blocked')
  })
})
