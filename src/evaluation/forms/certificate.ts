import type { Certificate } from '../../formula/types.ts'
import type { Library } from '../../library/library.ts'
import type { Ingredient } from '../../library/types.ts'
import { findingOf } from '../finding.ts'
import type { Finding } from '../types.ts'

/** What a certificate makes of a line. */
export interface Certified {
  readonly certificate: Certificate
  /** Mass share of the named substance (crystal water of its name included) in the article as it lies on the shelf. */
  readonly content: number
  readonly unitsPerGram?: number
}

/** Ordinary contents of an article, in percent of what its name says. */
export const ordinaryContent = { low: 90, high: 102 }
/** No lot holds more than this of what its name says; beyond it a figure was mistaken. */
export const mostContent = 115
const waterMolarMass = 18.0153

/**
 * Content of an article from its certificate. As is: the assay itself. On the anhydrous or dried basis: assay ×
 * (1 − water), which is the content of anhydrous substance, times M(as named) / M(anhydrous) for an article that is
 * named with its crystal water. Without an assay, water is reckoned as excess over the crystal water. The correction is made once.
 * @example contentOf(citric acid monohydrate, { assayPercent: 99.5, assayBasis: 'anhydrous', waterPercent: 8.6 }) → 0.995 × 0.914 × 210.14 / 192.12 = 0.9947
 */
export function contentOf(ingredient: Ingredient, certificate: Certificate): number {
  const { assayPercent, assayBasis = 'as-is', waterPercent } = certificate
  const assay = (assayPercent ?? 100) / 100
  if (assayBasis === 'as-is' && assayPercent !== undefined) return assay
  if (waterPercent === undefined && assayBasis === 'as-is') return assay
  const molarMass = ingredient.molarMass?.value
  const crystal = molarMass ? (ingredient.crystalWaters * waterMolarMass) / molarMass : 0
  const water = waterPercent === undefined ? crystal : waterPercent / 100
  return (assay * (1 - water)) / (1 - crystal)
}

/** The certificate of a line, or the finding that says why it is not taken. */
export function certify(
  key: string,
  ingredient: Ingredient,
  certificate: Certificate,
  library: Library,
): { readonly certified: Certified | null; readonly findings: readonly Finding[] } {
  const content = contentOf(ingredient, certificate)
  const percent = content * 100
  const about = {
    values: { ingredient: ingredient.name, percent, low: ordinaryContent.low, high: ordinaryContent.high },
    ingredients: [ingredient.id],
    lineKeys: [key],
  }
  if (!(percent > 0 && percent <= mostContent)) {
    return {
      certified: null,
      findings: [findingOf(library, 'certificate-impossible', { ...about, blocks: true })],
    }
  }
  const { unitsPerMg } = certificate
  const certified = {
    certificate,
    content,
    ...(unitsPerMg === undefined ? {} : { unitsPerGram: unitsPerMg * 1000 }),
  }
  const needsWater = certificate.assayBasis !== undefined && certificate.assayBasis !== 'as-is'
  return {
    certified,
    findings: [
      ...(percent < ordinaryContent.low || percent > ordinaryContent.high
        ? [findingOf(library, 'certificate-unusual', about)]
        : []),
      ...(needsWater && certificate.waterPercent === undefined
        ? [findingOf(library, 'certificate-without-water', about)]
        : []),
    ],
  }
}
