import { evaluate } from '../evaluation/evaluate.ts'
import { emptyFormula } from '../formula/document.ts'
import { loadLibrary } from '../library/library.ts'
import { pageActions } from './state/actions.ts'
import { keepEvaluated } from './state/evaluateNow.ts'
import { searchIn } from './state/search.ts'
import { createPageStore, type Page, type Paper } from './state/store.ts'
import { readKept, startAutosave } from './storage/autosave.ts'
import { browserDesk } from './storage/desk.ts'
import { browserShelf } from './storage/shelf.ts'
import { samplingActions } from './worker/sampler.ts'

/** Where paper is cut in inches. */
const letterRegions = /-(US|CA|MX|PH|CL|CO|VE)$/i

const paperOf = (language: string): Paper => (letterRegions.test(language) ? 'Letter' : 'A4')

const clock = {
  now: () => performance.now(),
  nextFrame: (run: () => void) => void requestAnimationFrame(run),
}

const samplingWorker = () =>
  new Worker(new URL('./worker/sampling.worker.ts', import.meta.url), { type: 'module' })

/** Puts the page together: library, kept sheet, state, evaluation, keeping. */
export async function startPage(): Promise<Page> {
  const library = loadLibrary()
  const shelf = browserShelf()
  const kept = await readKept(shelf)
  const store = createPageStore({
    library,
    formula: kept.kind === 'kept' ? kept.formula : emptyFormula(),
    drafts: kept.kind === 'kept' ? kept.drafts : {},
    paper: (kept.kind === 'kept' ? kept.paper : null) ?? paperOf(navigator.language),
  })
  if (kept.kind === 'unreadable') store.setState({ notice: kept.sentence })
  const newKey = () => crypto.randomUUID()
  const basic = pageActions({ store, newKey, emptyFormula })
  const autosave = startAutosave(
    {
      store,
      shelf,
      desk: browserDesk(navigator.locks),
      newStamp: newKey,
      replaceDocument: basic.replaceDocument,
    },
    kept.kind === 'kept' ? kept.stamp : null,
  )
  keepEvaluated(store, evaluate, clock)
  return {
    store,
    actions: { ...basic, ...autosave, ...samplingActions(store, samplingWorker) },
    search: searchIn(library),
  }
}
