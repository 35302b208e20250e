import type { PageState } from './store.ts'

/** A view of the state that is made anew only when one of the things it is made from has changed. */
export function viewOf<Inputs extends unknown[], View>(
  inputs: (state: PageState) => readonly [...Inputs],
  make: (...inputs: Inputs) => View,
): (state: PageState) => View {
  let last: { readonly inputs: readonly [...Inputs]; readonly view: View } | null = null
  return (state) => {
    const now = inputs(state)
    if (last && now.every((input, index) => input === last?.inputs[index])) return last.view
    last = { inputs: now, view: make(...now) }
    return last.view
  }
}
