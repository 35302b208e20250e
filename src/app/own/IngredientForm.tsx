import { useState, type FormEvent } from 'react'
import { makeIngredient, type KnownOfIngredient } from '../../library/make-ingredient.ts'
import type { ElectrolyteClass } from '../../library/types.ts'
import { usePage, usePageActions } from '../state/context.tsx'
import { typedNumber } from '../words/typed.ts'
import { TextField } from './TextField.tsx'

const blank = {
  name: '',
  formula: '',
  kind: '',
  equivalent: '',
  equivalentAt: '1',
  depression: '',
  factor: '',
  measured: '',
  origin: '',
}
type Texts = typeof blank

const kinds: readonly (readonly [value: '' | ElectrolyteClass, words: string])[] = [
  ['', 'not known'],
  ['non-electrolyte', 'gives no ions'],
  ['weak-electrolyte', 'weak acid or base'],
  ['uni-univalent', 'one ion of each single charge'],
  ['uni-divalent', 'two single cations, one double anion'],
  ['di-univalent', 'one double cation, two single anions'],
  ['di-divalent', 'one double cation, one double anion'],
]

/** Pairs "1 %: 58; 2 %: 112" as strengths and readings; null where one of them cannot be read. */
function readMeasured(text: string): KnownOfIngredient['measured'] | null {
  const parts = text
    .split(';')
    .map((part) => part.trim())
    .filter((part) => part !== '')
  const read = parts.map((part) => {
    const [percent, reading, ...more] = part.split(':')
    const atPercent = typedNumber((percent ?? '').replace('%', ''), 0.001, 60)
    const milliosmPerKg = typedNumber(reading ?? '', 0.1, 5000)
    return more.length > 0 || atPercent === null || milliosmPerKg === null
      ? null
      : { atPercent, milliosmPerKg }
  })
  return read.every((pair) => pair !== null) ? read : null
}

type Known =
  { readonly ok: true; readonly known: KnownOfIngredient } | { readonly ok: false; readonly refusal: string }

function knownOf(texts: Texts): Known {
  const number = (text: string, low: number, high: number) =>
    text.trim() === '' ? undefined : typedNumber(text, low, high)
  const e = number(texts.equivalent, 0.001, 2)
  const at = number(texts.equivalentAt, 0.001, 60)
  const depression = number(texts.depression, 0.001, 2)
  const factor = number(texts.factor, 0.5, 6)
  const measured = readMeasured(texts.measured)
  if (e === null || at === null)
    return { ok: false, refusal: 'E is a number such as 0.24 at a strength such as 1.' }
  if (depression === null)
    return { ok: false, refusal: 'The depression of a 1 % solution is a number of kelvin such as 0.14.' }
  if (factor === null) return { ok: false, refusal: 'i is a number from 0.5 to 6.' }
  if (measured === null) return { ok: false, refusal: 'Write measured readings as “1 %: 58; 2 %: 112”.' }
  return {
    ok: true,
    known: {
      name: texts.name,
      state: 'solid',
      equivalents: e === undefined ? [] : [{ atPercent: at ?? 1, value: e }],
      measured,
      origin: texts.origin,
      ...(texts.formula.trim() === '' ? {} : { formula: texts.formula.trim() }),
      ...(texts.kind === '' ? {} : { electrolyteClass: texts.kind as ElectrolyteClass }),
      ...(depression === undefined ? {} : { depression1Percent: depression }),
      ...(factor === undefined ? {} : { measuredI: factor }),
    },
  }
}

/** An ingredient that the library has not, from whatever is known of it. */
export function IngredientForm() {
  const library = usePage((state) => state.library)
  const { keepOwnIngredient, addLine } = usePageActions()
  const [texts, setTexts] = useState(blank)
  const [said, setSaid] = useState('')
  const set = (field: keyof Texts) => (text: string) => setTexts({ ...texts, [field]: text })
  const submit = (event: FormEvent) => {
    event.preventDefault()
    const read = knownOf(texts)
    if (!read.ok) return setSaid(read.refusal)
    const made = makeIngredient(read.known, library.ingredients)
    if (!made.ok) return setSaid(`${made.refusal.message} ${made.refusal.wayOut}`)
    keepOwnIngredient(made.value)
    addLine(made.value)
    setTexts(blank)
    return setSaid(`${made.value.name} is on your own shelf and in the formula; enter its amount there.`)
  }
  return (
    <form aria-labelledby="own-ingredient" onSubmit={submit}>
      <h3 id="own-ingredient">Enter an ingredient</h3>
      <p className="own-fields">
        <TextField label="Name" text={texts.name} onChange={set('name')} wide />
        <TextField label="Molecular formula" text={texts.formula} onChange={set('formula')} wide />
        <label>
          In water it{' '}
          <select
            className="inline-choice"
            value={texts.kind}
            onChange={(event) => set('kind')(event.currentTarget.value)}
          >
            {kinds.map(([value, words]) => (
              <option key={value} value={value}>
                {words}
              </option>
            ))}
          </select>
        </label>
        <TextField label="Sodium chloride equivalent" text={texts.equivalent} onChange={set('equivalent')} />
        <TextField label="at %" text={texts.equivalentAt} onChange={set('equivalentAt')} />
        <TextField
          label="Freezing-point depression of 1 %, K"
          text={texts.depression}
          onChange={set('depression')}
        />
        <TextField label="Measured i" text={texts.factor} onChange={set('factor')} />
        <TextField
          label="Measured osmolality, “1 %: 58; 2 %: 112”"
          text={texts.measured}
          onChange={set('measured')}
          wide
        />
        <TextField label="Where the figures are from" text={texts.origin} onChange={set('origin')} wide />
      </p>
      <button type="submit" className="plain-button">
        Keep it and add it
      </button>{' '}
      <span role="status">{said}</span>
    </form>
  )
}
