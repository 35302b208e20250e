import type { Ingredient } from '../../src/library/types.ts'
import type { Formula } from '../../src/formula/types.ts'

/** The least a file may hold. */
export const least = {
  format: 'evenwater.formula',
  version: 1,
  route: 'ophthalmic',
  finalVolume: '100 mL',
  lines: [],
}

export const ownRecord: Ingredient = {
  id: 'demo-sugar',
  name: 'Demo sugar',
  synonyms: [],
  formula: 'C6H12O6',
  crystalWaters: 0,
  molarMass: {
    value: 180.156,
    unit: 'g/mol',
    kind: 'derived',
    source: 'project',
    confidence: 'high',
    fromMemory: false,
  },
  state: 'solid',
  percentBasis: 'w/v',
  roles: ['tonicity agent'],
  tags: [],
  releases: [{ species: 'demo-sugar', count: 1, charge: 0 }],
  sodiumChlorideEquivalents: [],
}

/** A document with every field there is. */
export const full: Formula = {
  format: 'evenwater.formula',
  version: 1,
  title: 'Demo eye drops',
  route: 'ophthalmic',
  finalVolume: '10 mL',
  target: { quantity: 'osmolality', value: '290 mOsm/kg' },
  pH: 6.8,
  temperature: '25 °C',
  lines: [
    { key: 'a', ingredient: 'pilocarpine-hydrochloride', amount: '1 %', note: 'first' },
    { key: 'b', ingredient: ownRecord, amount: 'q.s.', share: 2, cap: '1 %' },
    { key: 'c', ingredient: 'sodium-chloride', amount: 'q.s.' },
  ],
  balance: '1 mg',
  bench: {
    balances: [
      {
        name: 'analytical',
        readability: '0.1 mg',
        repeatability: '0.08 mg',
        sensitivity: '6 mg',
        allowedErrorPercent: 5,
        capacity: '220 g',
      },
    ],
    measures: [
      { name: 'syringe', kind: 'syringe', capacity: '5 mL', graduation: '0.2 mL', tolerance: '0.2 mL' },
    ],
  },
  batch: { units: 10, excess: '5 mL', overfill: 'mobile', holdUp: '2 mL', samples: '1 mL' },
  order: { orderNumber: '17', lot: 'D1', masterRecord: 'M1', container: 'dropper', preparedFor: 'Demo' },
  patient: { ageYears: 40, weightKg: 70, doseVolume: '0.05 mL', infusionRate: '1 mL/h' },
  vehicle: 'water for injection',
  notes: 'Invented for demonstration.',
  acknowledgements: [{ code: 'demo-stop', reason: 'Because it is a demonstration.' }],
}

/** The same object with some keys changed or, where undefined, taken out. */
export const changed = (document: object, changes: Readonly<Record<string, unknown>>): unknown =>
  Object.fromEntries(Object.entries({ ...document, ...changes }).filter(([, value]) => value !== undefined))

const line = (changes: Readonly<Record<string, unknown>>) => ({
  lines: [
    { key: 'a', ingredient: 'sodium-chloride', amount: '1 %' },
    changed({ ingredient: 'sodium-chloride', amount: '1 %' }, changes),
  ],
})

/** Documents that are not read, each with the place that is named. */
export const broken: readonly (readonly [what: string, document: unknown, named: string])[] = [
  ['a list', [], 'not a formula'],
  ['null', null, 'not a formula'],
  ['text', 'evenwater.formula', 'not a formula'],
  ['another format', changed(least, { format: 'other' }), 'not a formula'],
  ['no format', changed(least, { format: undefined }), 'not a formula'],
  ['no version', changed(least, { version: undefined }), 'version'],
  ['a version in words', changed(least, { version: '1' }), 'version'],
  ['version 0', changed(least, { version: 0 }), 'no version 0'],
  ['version 1.5', changed(least, { version: 1.5 }), 'version'],
  ['version 2', changed(least, { version: 2 }), 'version 2'],
  ['no route', changed(least, { route: undefined }), 'The route is missing'],
  ['an unknown route', changed(least, { route: 'by-mouth' }), 'The route has to be one of'],
  ['a route of the prototype', changed(least, { route: 'constructor' }), 'The route has to be one of'],
  ['no volume', changed(least, { finalVolume: undefined }), 'The final volume is missing'],
  ['a volume without words', changed(least, { finalVolume: 100 }), 'The final volume has to be text'],
  ['no lines', changed(least, { lines: undefined }), 'The list of lines is missing'],
  ['lines that are none', changed(least, { lines: {} }), 'The list of lines has to be a list'],
  [
    '501 lines',
    changed(least, { lines: Array.from({ length: 501 }, () => ({ ingredient: 'x', amount: '1 %' })) }),
    '501 lines',
  ],
  ['a line that is none', changed(least, { lines: ['sodium-chloride'] }), 'Line 1 has to be an object'],
  [
    'an amount of 10 kB',
    changed(least, line({ amount: '1'.repeat(10_000) })),
    'The amount of line 2 is longer than 2000',
  ],
  ['an amount that is a number', changed(least, line({ amount: 1 })), 'The amount of line 2 has to be text'],
  ['no amount', changed(least, line({ amount: undefined })), 'The amount of line 2 is missing'],
  ['no ingredient', changed(least, line({ ingredient: undefined })), 'The ingredient of line 2 is missing'],
  [
    'an ingredient that is a number',
    changed(least, line({ ingredient: 3 })),
    'The ingredient of line 2 has to be',
  ],
  ['a share of zero', changed(least, line({ share: 0 })), 'The share of line 2 has to be above zero'],
  ['an empty key', changed(least, line({ key: '' })), 'The key of line 2 is empty'],
  ['a pH of 15', changed(least, { pH: 15 }), 'The pH has to be at most 14'],
  ['a pH in words', changed(least, { pH: '7' }), 'The pH has to be a number'],
  ['a pH of null', changed(least, { pH: null }), 'The pH has to be a number'],
  [
    'an unknown target',
    changed(least, { target: { quantity: 'osmolarity', value: '1' } }),
    'The target (quantity) has to be one of',
  ],
  [
    'a target without value',
    changed(least, { target: { quantity: 'osmolality' } }),
    'The target (value) is missing',
  ],
  [
    'half a container',
    changed(least, { batch: { units: 1.5 } }),
    'The batch (units) has to be a whole number',
  ],
  ['a batch in words', changed(least, { batch: '10' }), 'The batch has to be an object'],
  [
    'a person of minus one year',
    changed(least, { patient: { ageYears: -1 } }),
    'The patient (ageYears) has to be at least 0',
  ],
  ['a title of 10 kB', changed(least, { title: 'x'.repeat(10_000) }), 'The title is longer than 500'],
  [
    'notes of 30 kB',
    changed(least, { notes: 'x'.repeat(30_000) }),
    'The text of the notes is longer than 20000',
  ],
  [
    'a record with an unknown key',
    changed(least, line({ ingredient: { ...ownRecord, colour: 'red' } })),
    'The ingredient.colour of line 2 is not known here',
  ],
  [
    'a record without a source',
    changed(least, line({ ingredient: { ...ownRecord, molarMass: { value: 180 } } })),
    'The ingredient.molarMass.unit of line 2 is missing',
  ],
]

/** Documents that are not read for a reason that a JSON Schema cannot state. */
export const brokenBeyondSchema: readonly (readonly [what: string, document: unknown, named: string])[] = [
  ['one key twice', changed(least, line({ key: 'a' })), 'Two lines have the key “a”'],
  [
    'a record whose mass is not its formula’s',
    changed(
      least,
      line({ ingredient: { ...ownRecord, molarMass: { ...ownRecord.molarMass, value: 1801.56 } } }),
    ),
    'Line 2: ',
  ],
  [
    'a record with a foreign id',
    changed(least, line({ ingredient: { ...ownRecord, id: 'sodium-chloride' } })),
    'Line 2: ',
  ],
]
