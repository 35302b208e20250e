import { expressNumber } from '../../quantity/express.ts'
import type { Finding } from '../types.ts'
import type { CautionContext } from './context.ts'
import { perMillilitreOf } from './lineConditions.ts'

/* What accumulates in a small or ill patient; drugs are dosed on purpose and told elsewhere. */
const countedIons = ['Na+', 'K+', 'Ca+2', 'Mg+2', 'Al+3', 'phosphate', 'borate']
const countedRoles = new Set([
  'preservative',
  'preservative aid',
  'cosolvent',
  'antioxidant',
  'chelator',
  'surfactant',
])

const figure = (value: number) => expressNumber(value, { significant: 3 })

/**
 * What a patient of known weight gets per kg in a day, and of potassium in an hour: a load is held against the sum of
 * all medicines, so it is told whether or not it crosses a limit here.
 */
export function dailyLoads(context: CautionContext): Finding[] {
  const { weightKg, doseVolumeMl, infusionRateMlPerH } = context.patient
  const running = infusionRateMlPerH === undefined ? undefined : 24 * infusionRateMlPerH
  if (weightKg === undefined || (running === undefined && doseVolumeMl === undefined)) return []
  const millilitres = Math.max(running ?? 0, doseVolumeMl ?? 0)
  const loads = loadsOf(context, millilitres / weightKg)
  if (loads.length === 0) return []
  const hourly =
    infusionRateMlPerH === undefined ? [] : potassiumInAnHour(context, infusionRateMlPerH / weightKg)
  return [
    {
      code: 'loads-of-a-day',
      severity: 'note',
      values: {
        volume: `${figure(millilitres)} mL`,
        basis: millilitres === running ? '24 h at the rate given' : 'one dose a day',
        weight: `${figure(weightKg)} kg`,
        details: [...loads, ...hourly].join('; '),
      },
      ingredients: [],
      lineKeys: [],
      source: 'project',
      blocks: false,
    },
  ]
}

function loadsOf({ lines, ionTotals, solution }: CautionContext, mlPerKg: number): string[] {
  const ions = countedIons.flatMap((ion) => {
    const mmolPerL = ionTotals[ion]
    if (mmolPerL === undefined || mmolPerL === 0) return []
    return [mmolPerL === null ? `${ion} not known` : `${ion} ${figure((mmolPerL / 1000) * mlPerKg)} mmol/kg`]
  })
  const excipients = lines
    .filter(({ ingredient: { roles } }) => roles.some((role) => countedRoles.has(role)))
    .map((line) => {
      const { milligrams } = perMillilitreOf(line)
      const load = milligrams === null ? 'not known' : `${figure(milligrams * mlPerKg)} mg/kg`
      return `${line.ingredient.name} ${load}`
    })
  const osmolarity = solution?.osmolarity ?? solution?.labelOsmolarity ?? null
  const osmotic =
    osmolarity === null
      ? []
      : [`osmotic load ${figure((osmolarity / 1000) * mlPerKg)} mOsm per kg of body weight`]
  return [...ions, ...excipients, ...osmotic]
}

function potassiumInAnHour({ ionTotals }: CautionContext, mlPerKg: number): string[] {
  const mmolPerL = ionTotals['K+']
  return mmolPerL ? [`K+ ${figure((mmolPerL / 1000) * mlPerKg)} mmol/kg in an hour`] : []
}
