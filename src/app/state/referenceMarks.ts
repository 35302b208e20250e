import type { ReferenceMark } from '../axis/model.ts'
import { scaleOf } from '../../evaluation/yardstick.ts'
import type { Library } from '../../library/library.ts'

const strengths = [0.45, 0.9]

const made = new WeakMap<Library, readonly ReferenceMark[]>()

/** Sodium chloride solutions that everyone in the trade knows, by the library's own scale. */
export function referenceMarks(library: Library): readonly ReferenceMark[] {
  const known = made.get(library)
  if (known) return known
  const scale = scaleOf(library)
  const marks = strengths.flatMap((percent) => {
    const osmolality = scale.osmolalityOf(percent)
    return osmolality === null ? [] : [{ label: `${percent} % NaCl`, osmolalityMilliosmPerKg: osmolality }]
  })
  made.set(library, marks)
  return marks
}
