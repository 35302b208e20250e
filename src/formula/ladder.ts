import type { Read } from '../quantity/amount.ts'
import { accept, refuse } from '../quantity/refusal.ts'
import type { PlainObject } from './plainObject.ts'

export const thisVersion = 1

/** One step up: the document of a version as the next one writes it. */
type Rung = (content: PlainObject) => PlainObject

/** By the version they start from. There has been one version so far. */
const rungs: ReadonlyMap<number, Rung> = new Map()

const refuseVersion = (message: string, wayOut: string) => refuse('version-unreadable', message, wayOut)

/**
 * A document of any version that was ever written, as today's version writes it. Refuses a version that does
 * not exist and one that is newer than this program (version-unreadable).
 */
export function climb(content: PlainObject): Read<PlainObject> {
  const { version } = content
  if (typeof version !== 'number' || !Number.isInteger(version)) {
    return refuseVersion('The formula does not say its version.', `Write "version": ${thisVersion}.`)
  }
  if (version > thisVersion) {
    return refuseVersion(
      `The formula is of version ${version}; this program reads up to version ${thisVersion}.`,
      'Open it with a newer version of Evenwater.',
    )
  }
  let reached = content
  for (let from = version; from < thisVersion; from += 1) {
    const rung = rungs.get(from)
    if (!rung) return refuseVersion(`There is no version ${version}.`, `Write "version": ${thisVersion}.`)
    reached = rung(reached)
  }
  return accept(reached)
}
