/** What a typed amount can mean. Canonical unit of `value` in the comment. */
export type AmountKind =
  | 'quantity-sufficient' // value is 0 and unused
  | 'mass' // g in the whole volume
  | 'volume' // mL in the whole volume
  | 'moles' // mmol in the whole volume
  | 'equivalents' // mEq in the whole volume
  | 'mass-per-volume' // g per mL (10 mg/mL, 2 % w/v)
  | 'volume-per-volume' // mL per mL (2 % v/v)
  | 'mass-per-mass' // g per g (2 % w/w)
  | 'moles-per-volume' // mmol per mL
  | 'equivalents-per-volume' // mEq per mL
  | 'moles-per-water-mass' // mol per kg of water
  | 'units' // units of biological activity in the whole volume
  | 'units-per-volume' // units per mL
  | 'percent' // bare "1 %": w/v or v/v, decided by the ingredient's percent basis; value is the number before "%"
  | 'ratio' // "1:1000": parts in parts, w/v or v/v by the ingredient; value is the quotient

export interface Amount {
  readonly kind: AmountKind
  readonly value: number
  /** The text as typed, trimmed. */
  readonly text: string
}

/** Why a piece of text was not taken, and how to write it instead. */
export interface Refusal {
  readonly code: string
  readonly message: string
  readonly wayOut: string
}

export type Read<T> =
  { readonly ok: true; readonly value: T } | { readonly ok: false; readonly refusal: Refusal }
