/* Keys of what a stock holds: one line of a formula can bring several ingredients. */

const separator = '\u001f'

/** Key of one ingredient of a stock that a line measures. */
export const partKey = (lineKey: string, ingredientId: string) => `${lineKey}${separator}${ingredientId}`

/** The formula's own line behind a key, be it that of a line or of a part of a stock. */
export const lineKeyOf = (key: string): string => key.split(separator)[0] ?? key
