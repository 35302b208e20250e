import { loadBeyondUse } from '../library/steps.ts'
import type { Evaluation } from '../evaluation/types.ts'
import { eyeRoutes, sterileRoutes } from './routes.ts'
import { text } from './sections.ts'
import type { SheetSection } from './types.ts'

/** The date is never set here; what policies say is printed as a caution. */
export function beyondUseSection({ formula: { route } }: Evaluation): SheetSection {
  const { sterile, nonsterile, eye } = loadBeyondUse()
  const orientation = sterileRoutes.has(route) ? sterile : nonsterile
  const opened = eyeRoutes.has(route) ? ` ${eye.text}` : ''
  return text('Beyond-use date', [
    `Set by local policy and evidence of stability, never by this sheet; it stays blank until then. ${orientation.text}${opened} (${orientation.evidence}: verify)`,
  ])
}

/** What the figures are and are not. */
export const verificationSection = (evaluation: Evaluation): SheetSection =>
  text('Standing of these figures', [
    `Every result on this sheet needs independent verification before use. Cautions defer to local policy, the product label and licensed practice. Figures marked from memory were recalled and not read again. Library ${evaluation.libraryVersion}.`,
  ])
