import type { Formula } from '../../formula/types.ts'
import { apply, type Command } from '../../formula/commands.ts'

/** One undo step: everything that was done with one intention. */
export interface Step {
  /** Typing on in the same cell belongs to the same step. */
  readonly intention: string
  readonly undo: readonly Command[]
  readonly redo: readonly Command[]
}

export interface Desk {
  readonly formula: Formula
  readonly past: readonly Step[]
  readonly future: readonly Step[]
}

export const mostSteps = 1000

interface Applied {
  readonly formula: Formula
  /** Undoes all of them when applied in this order. */
  readonly inverses: readonly Command[]
}

function applyAll(formula: Formula, commands: readonly Command[]): Applied {
  const inverses: Command[] = []
  let reached = formula
  for (const command of commands) {
    const { formula: next, inverse } = apply(reached, command)
    reached = next
    inverses.unshift(inverse)
  }
  return { formula: reached, inverses }
}

/** Does the commands as one step, or as part of the last step when the intention goes on. */
export function perform(desk: Desk, intention: string, commands: readonly Command[]): Desk {
  const { formula, inverses } = applyAll(desk.formula, commands)
  if (formula === desk.formula) return desk
  const last = desk.past.at(-1)
  const goesOn = last !== undefined && last.intention === intention && desk.future.length === 0
  const step: Step = goesOn
    ? { intention, undo: [...inverses, ...last.undo], redo: [...last.redo, ...commands] }
    : { intention, undo: inverses, redo: commands }
  const before = goesOn ? desk.past.slice(0, -1) : desk.past
  return { formula, past: [...before, step].slice(-mostSteps), future: [] }
}

export function undo(desk: Desk): Desk {
  const step = desk.past.at(-1)
  if (!step) return desk
  return {
    formula: applyAll(desk.formula, step.undo).formula,
    past: desk.past.slice(0, -1),
    future: [step, ...desk.future],
  }
}

export function redo(desk: Desk): Desk {
  const [step, ...future] = desk.future
  if (!step) return desk
  return { formula: applyAll(desk.formula, step.redo).formula, past: [...desk.past, step], future }
}

/** Takes the last step back as if it had never been, when it belongs to the intention. */
export function drop(desk: Desk, intention: string): Desk {
  if (desk.past.at(-1)?.intention !== intention) return desk
  return { ...undo(desk), future: [] }
}
