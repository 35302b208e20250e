import type { Datum } from '../../library/types.ts'
import type { Figure } from '../types.ts'

/* Short makers, so that a trace reads as the arithmetic does. */

export const figure = (name: string, value: number | null, unit: string): Figure => ({ name, value, unit })

/** A figure that stands for a datum of the library. */
export const datumFigure = (name: string, datum: Datum): Figure => ({
  name,
  value: datum.value,
  unit: datum.unit,
  source: datum.source,
  fromMemory: datum.fromMemory,
})
