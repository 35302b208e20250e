import { massText, volumeText, wholeText } from './say.ts'
import { methodWords } from './arithmetic.ts'
import type { Evaluation } from '../evaluation/types.ts'
import type { SheetSection } from './types.ts'

/** The methods beside each other, so that the gap between them is on paper. */
export function methodSection(evaluation: Evaluation): SheetSection | null {
  if (evaluation.methods.length === 0 || evaluation.status === 'blocked') return null
  return {
    kind: 'table',
    heading: 'Methods side by side',
    columns: [
      { label: 'Method', align: 'start' },
      { label: 'mOsm/kg', align: 'end' },
      { label: 'Adjuster by this method', align: 'end' },
      { label: 'Isotonic volume', align: 'end' },
    ],
    rows: evaluation.methods.map((method) => [
      { text: methodWords[method.method] },
      {
        text:
          method.osmolalityMilliosmPerKg === null
            ? 'a value is missing'
            : wholeText(method.osmolalityMilliosmPerKg),
      },
      { text: method.adjusterGrams === null ? 'none' : massText(method.adjusterGrams, 4) },
      { text: method.isotonicVolumeMl === null ? 'none' : volumeText(method.isotonicVolumeMl, 3) },
    ]),
  }
}
