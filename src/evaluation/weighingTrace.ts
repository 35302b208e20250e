import { printAmount } from '../quantity/writeAmount.ts'
import type { Plan } from './adjusting/plan.ts'
import type { Lowered } from './lowering.ts'
import { figure } from './methods/figures.ts'
import type { Figure, TraceStep } from './types.ts'

/** How every amount became a mass in the evaluated volume. */
export function weighingTrace(plan: Plan, lowered: readonly Lowered[]): readonly TraceStep[] {
  const lines = new Map([...plan.solutes, ...plan.adjusters, ...plan.fills].map((line) => [line.key, line]))
  return lowered.flatMap((mass) => {
    const line = lines.get(mass.key)
    if (!line) return []
    const { ingredient, amount, part } = line
    const ordered =
      part === 'adjuster' ? 'sized to the target' : `${printAmount(amount)} in the evaluated volume`
    const inputs: Figure[] = [figure('volume', plan.setting.volumeMl, 'mL')]
    if (ingredient.molarMass) inputs.push(figure('M', ingredient.molarMass.value, 'g/mol'))
    const step = {
      key: mass.key,
      subject: ingredient.name,
      rule: ordered,
      inputs,
      result: figure('mass', mass.gramsExact, 'g'),
    }
    return mass.grams === mass.gramsExact ? [step] : [step, roundingStep(mass, ingredient.name, plan)]
  })
}

function roundingStep(mass: Lowered, name: string, { balance }: Plan): TraceStep {
  const inputs: Figure[] = []
  if (mass.scale) inputs.push(figure('readability', mass.scale.readabilityG, 'g'))
  if (mass.aliquot) inputs.push(figure('weighed for the dilution', mass.aliquot.weighGrams, 'g'))
  if (mass.aliquot) inputs.push(figure('multiple', mass.aliquot.multiple, '1'))
  if (mass.measured?.measure.graduationMl) {
    inputs.push(figure('mark', mass.measured.measure.graduationMl, 'mL'))
  }
  return {
    key: `${mass.key}-rounded`,
    subject: name,
    rule: mass.measured
      ? 'rounded to the measure, batch as measured'
      : 'rounded to the balance, batch as weighed',
    inputs: [...inputs, figure('batch factor', balance.batchFactor, '1')],
    result: figure('mass', mass.grams, 'g'),
  }
}
