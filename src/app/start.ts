import { emptyFormula } from '../formula/document.ts'
import { openingOnly } from '../library/opening.ts'
import { bringCalculation } from './offline/bringCalculation.ts'
import { keepCopyInBrowser } from './offline/browser.ts'
import { browserShelfDesk } from './shelf/browser.ts'
import { firstLineage } from './shelf/origin.ts'
import { pageActions } from './state/actions.ts'
import { searchIn } from './state/search.ts'
import { createPageStore, type Page, type Paper } from './state/store.ts'
import { readKept, startAutosave } from './storage/autosave.ts'
import { browserDesk } from './storage/desk.ts'
import { browserShelf } from './storage/shelf.ts'
import { comparisonActions } from './worker/comparison.ts'
import { outActions } from './transfer/outActions.ts'
import { watchLinks } from './transfer/watchLinks.ts'
import { ownActions } from './own/actions.ts'
import { browserOwn } from './storage/ownShelf.ts'
import { samplingActions } from './worker/sampler.ts'

/** Where paper is cut in inches. */
const letterRegions = /-(US|CA|MX|PH|CL|CO|VE)$/i

const paperOf = (language: string): Paper => (letterRegions.test(language) ? 'Letter' : 'A4')

const clock = {
  now: () => performance.now(),
  nextFrame: (run: () => void) => void requestAnimationFrame(run),
}

const calculationWorker = () =>
  new Worker(new URL('./worker/calculation.worker.ts', import.meta.url), { type: 'module' })

/** Puts the page together: library, kept sheet, state, evaluation, keeping. */
export async function startPage(): Promise<Page> {
  const library = openingOnly()
  const shelf = browserShelf()
  const kept = await readKept(shelf)
  const store = createPageStore({
    library,
    calculation: 'coming',
    formula: kept.kind === 'kept' ? kept.formula : emptyFormula(),
    drafts: kept.kind === 'kept' ? kept.drafts : {},
    paper: (kept.kind === 'kept' ? kept.paper : null) ?? paperOf(navigator.language),
    origins: kept.kind === 'kept' ? { [firstLineage]: kept.origin } : {},
  })
  if (kept.kind === 'unreadable') store.setState({ notice: kept.sentence })
  const newKey = () => crypto.randomUUID()
  const own = browserOwn()
  own.read().then(
    (content) => store.setState({ own: content }),
    () => undefined,
  )
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
  const shelfDesk = browserShelfDesk({ page: store, newKey, replaceDocument: basic.replaceDocument })
  watchLinks({
    store,
    shelf: shelfDesk.actions,
    replaceDocument: basic.replaceDocument,
    seatKnown: autosave.seatKnown,
  })
  void bringCalculation(store, clock, () => import('./calculation.ts')).then(() => keepCopyInBrowser(store))
  return {
    store,
    actions: {
      ...basic,
      ...autosave,
      ...ownActions(store, own),
      ...samplingActions(store, calculationWorker),
      ...outActions(store),
      ...comparisonActions(store, calculationWorker),
    },
    search: searchIn(library, () => store.getState().own),
    shelf: shelfDesk,
  }
}
