import { usePage, usePageActions, useSearch } from '../state/context.tsx'
import { recentCandidates } from '../state/search.ts'
import { IngredientSearch } from './IngredientSearch.tsx'

interface Props {
  readonly row: number
  readonly onAdded: (row: number) => void
}

/** The last row: typing a name in it makes a line. */
export function AddRow({ row, onAdded }: Props) {
  const actions = usePageActions()
  const find = useSearch()
  const library = usePage((state) => state.library)
  const own = usePage((state) => state.own)
  const recent = () => recentCandidates(library, own)
  return (
    <tr role="row" className="add-row no-print">
      <td role="cell" colSpan={8} className="ingredient-cell">
        <span className="name-cell">
          <span className="add-mark" aria-hidden="true">
            +
          </span>
          <IngredientSearch
            label="Add an ingredient"
            row={row}
            value=""
            empty="add an ingredient"
            invalid={false}
            find={find}
            recent={recent}
            onChoose={(candidate) => {
              actions.noteUse(candidate.id)
              if (candidate.stock) actions.addStockLine(candidate.stock)
              else actions.addLine(candidate.record ?? candidate.id)
              onAdded(row)
            }}
            onLeave={(text) => {
              if (text !== '') actions.addLine(text)
            }}
          />
        </span>
      </td>
    </tr>
  )
}
