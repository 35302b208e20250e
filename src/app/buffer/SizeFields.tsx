import type { BufferSize } from '../../evaluation/buffers/types.ts'
import { InlineChoice } from '../common/InlineChoice.tsx'
import { typedNumber } from '../words/typed.ts'
import { NumberField } from './NumberField.tsx'

/** How much buffer, as typed. */
export interface SizeTexts {
  readonly kind: 'strength' | 'capacity' | 'load'
  readonly strength: string
  readonly capacity: string
  readonly load: string
  readonly change: string
}

export const usualSize: SizeTexts = {
  kind: 'strength',
  strength: '20',
  capacity: '10',
  load: '1',
  change: '0.1',
}

const strengthOf = (text: string) => typedNumber(text, 0.01, 2000)
const capacityOf = (text: string) => typedNumber(text, 0.01, 1000)
const loadOf = (text: string) => typedNumber(text, 0.001, 1000)
const changeOf = (text: string) => typedNumber(text, 0.01, 2)

/** The size that was typed; null while a number cannot be read. */
export function sizeOf({ kind, strength, capacity, load, change }: SizeTexts): BufferSize | null {
  if (kind === 'strength') {
    const millimolesPerLitre = strengthOf(strength)
    return millimolesPerLitre === null ? null : { kind: 'strength', millimolesPerLitre }
  }
  if (kind === 'capacity') {
    const millimolesPerLitrePerPH = capacityOf(capacity)
    return millimolesPerLitrePerPH === null ? null : { kind: 'capacity', millimolesPerLitrePerPH }
  }
  const [expected, allowed] = [loadOf(load), changeOf(change)]
  if (expected === null || allowed === null) return null
  return { kind: 'capacity', millimolesPerLitrePerPH: expected / allowed }
}

interface Props {
  readonly sizes: SizeTexts
  onChange(sizes: SizeTexts): void
}

/** Strength, capacity, or the acid or base expected with the change of pH allowed. */
export function SizeFields({ sizes, onChange }: Props) {
  const set = (field: keyof SizeTexts) => (text: string) => onChange({ ...sizes, [field]: text })
  return (
    <>
      <InlineChoice
        label="Size of the buffer"
        value={sizes.kind}
        choices={[
          { value: 'strength', words: 'with a strength of' },
          { value: 'capacity', words: 'with a capacity of' },
          { value: 'load', words: 'to take up acid or base of' },
        ]}
        onChoose={(kind) => onChange({ ...sizes, kind })}
      />{' '}
      {sizes.kind === 'strength' && (
        <NumberField
          label="Strength"
          quiet
          unit="mmol/L"
          text={sizes.strength}
          valid={strengthOf(sizes.strength) !== null}
          help="Write 0.01 to 2000."
          onChange={set('strength')}
        />
      )}
      {sizes.kind === 'capacity' && (
        <NumberField
          label="Capacity"
          quiet
          unit="mmol/L for one unit of pH"
          text={sizes.capacity}
          valid={capacityOf(sizes.capacity) !== null}
          help="Write 0.01 to 1000."
          onChange={set('capacity')}
        />
      )}
      {sizes.kind === 'load' && (
        <>
          <NumberField
            label="Load"
            quiet
            unit="mmol/L"
            text={sizes.load}
            valid={loadOf(sizes.load) !== null}
            help="Write 0.001 to 1000."
            onChange={set('load')}
          />{' '}
          <NumberField
            label="while the pH moves by no more than"
            text={sizes.change}
            valid={changeOf(sizes.change) !== null}
            help="Write 0.01 to 2."
            onChange={set('change')}
          />
        </>
      )}
    </>
  )
}
