import type { Condition, Metric } from '../../library/conditions.ts'
import { routeQuantities } from '../../library/routes.ts'
import type { CautionContext } from './context.ts'
import { crosses } from './limits.ts'
import { readMetric } from './metrics.ts'
import { outcome, unknown, type Outcome } from './outcome.ts'
import { bandText } from './words.ts'

/** Whether the solution lies outside a band of its route, in the quantity in which the route is limited. */
export function beyondRoute(
  { beyond, of }: Extract<Condition, { readonly beyond: unknown }>,
  context: CautionContext,
): Outcome {
  const guardrail = context.limits[of]
  const band = guardrail?.[beyond]
  if (!guardrail || !band || (band.low === undefined && band.high === undefined)) return outcome(false)
  const unit = routeQuantities[guardrail.quantity]
  const metric: Metric = guardrail.quantity
  const value = readMetric(context, metric, unit)
  if (typeof value !== 'number') return unknown([value.need])
  const limit = {
    ...(band.low === undefined ? {} : { below: band.low }),
    ...(band.high === undefined ? {} : { above: band.high }),
  }
  if (!crosses(value, limit)) return outcome(false)
  return outcome(true, { value, unit: unit === 'pH' ? '' : unit, band: bandText(band, unit) })
}
