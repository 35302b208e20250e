import { useShelf, useShelfActions } from '../state/context.tsx'
import { goToShelf } from '../shelf/goToShelf.ts'
import { useStanding } from '../shelf/useStanding.ts'

/** Puts the sheet on the shelf; says when it is there as it stands. */
export function KeepButton() {
  const standing = useStanding()
  const actions = useShelfActions()
  const isThere = standing.kind === 'as-kept'
  /** What hinders it stands at the shelf, with the ways out. */
  const keep = async () => {
    if (await actions.keepOnShelf()) return
    actions.setOpen(true)
    goToShelf()
  }
  return (
    <button type="button" className="plain-button" aria-disabled={isThere} onClick={() => void keep()}>
      {isThere ? 'Kept on the shelf' : 'Keep on the shelf'}
    </button>
  )
}

/** Opens the shelf and goes there. */
export function ShelfButton() {
  const open = useShelf((state) => state.open)
  const actions = useShelfActions()
  const toggle = () => {
    actions.setOpen(!open)
    if (!open) goToShelf()
  }
  return (
    <button type="button" className="plain-button" aria-expanded={open} onClick={toggle}>
      Shelf
    </button>
  )
}
