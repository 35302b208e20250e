import { useEffect, useId, useRef, type KeyboardEvent } from 'react'
import type { Candidate } from '../state/search.ts'
import { useCombobox } from './useCombobox.ts'

interface Props {
  readonly label: string
  readonly row: number
  /** What the cell holds when nothing is being typed. */
  readonly value: string
  readonly empty: string
  readonly describedBy?: string | undefined
  readonly invalid: boolean
  readonly find: (text: string) => readonly Candidate[]
  readonly onChoose: (candidate: Candidate) => void
  readonly recent?: () => readonly Candidate[]
  /** Text that was typed and left without choosing. */
  readonly onLeave: (text: string) => void
}

/** The ingredient cell: a text field that offers the library's names, synonyms and near misses. */
export function IngredientSearch(props: Props) {
  const { label, row, value, empty, describedBy, invalid, find, onChoose, onLeave, recent } = props
  const listId = useId()
  const box = useCombobox({ find, onChoose, recent })
  const { typed, candidates, active, open } = box
  const keys = (event: KeyboardEvent) => {
    if (box.onKey(event)) {
      event.preventDefault()
      event.stopPropagation()
    }
  }
  const leave = () => {
    if (typed !== null) onLeave(typed.trim())
    box.close()
  }
  return (
    <span className="search-cell">
      <input
        className="cell-input"
        data-row={row}
        data-column="ingredient"
        role="combobox"
        aria-label={label}
        aria-autocomplete="list"
        aria-expanded={open}
        aria-controls={listId}
        aria-activedescendant={open ? `${listId}-${active}` : undefined}
        aria-describedby={describedBy}
        aria-invalid={invalid || undefined}
        autoComplete="off"
        spellCheck={false}
        placeholder={empty}
        value={typed ?? value}
        onChange={(event) => box.type(event.currentTarget.value)}
        onKeyDown={keys}
        onBlur={leave}
      />
      <span className="cell-shown" aria-hidden="true">
        {typed ?? value}
      </span>
      <Candidates id={listId} candidates={candidates} active={active} onChoose={box.choose} />
      {typed !== null && typed.trim() !== '' && !open && (
        <span className="candidates nothing-found" role="status">
          Nothing in the library is called that.
        </span>
      )}
    </span>
  )
}

interface ListProps {
  readonly id: string
  readonly candidates: readonly Candidate[]
  readonly active: number
  readonly onChoose: (candidate: Candidate) => void
}

function Candidates({ id, candidates, active, onChoose }: ListProps) {
  const list = useRef<HTMLUListElement>(null)
  useEffect(() => {
    list.current?.children[active]?.scrollIntoView({ block: 'nearest' })
  }, [active])
  return (
    <ul
      ref={list}
      id={id}
      className="candidates"
      role="listbox"
      aria-label="Ingredients found"
      hidden={candidates.length === 0}
    >
      {candidates.map((candidate, index) => (
        <li
          key={candidate.id}
          id={`${id}-${index}`}
          role="option"
          aria-selected={index === active}
          className="candidate"
          onMouseDown={(event) => event.preventDefault()}
          onClick={() => onChoose(candidate)}
        >
          <span className="candidate-name">{candidate.name}</span>
          {candidate.matched !== null && <span className="soft small"> also called {candidate.matched}</span>}
          <span className="candidate-facts soft small">{candidate.facts}</span>
        </li>
      ))}
    </ul>
  )
}
