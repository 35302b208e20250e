/**
 * How one document writes numbers. `en`: 1,234.5 on paper, decimal point when typed. `decimal-comma`:
 * 1 234,5 on paper, decimal comma when typed. Groups of thousands are never typed: they are where a comma
 * and a point are mistaken for each other.
 */
export type Locale = 'en' | 'decimal-comma'

/** Plain decimal digits with the locale's decimal mark and no groups, as a person would type them. */
export const typedDigits = (plainDigits: string, locale: Locale) =>
  locale === 'en' ? plainDigits : plainDigits.replace(/(\d)\.(?=\d)/g, '$1,')
