import { Component, type ReactNode } from 'react'

interface Props {
  /** What stands in it, for the sentence. */
  readonly what: string
  /** A new revision gets a new try. */
  readonly revision: number
  readonly children: ReactNode
}

interface State {
  readonly broken: string | null
  readonly revision: number
}

/** Keeps a part that breaks from taking the page and the formula with it: it says so and shows nothing. */
export class Guard extends Component<Props, State> {
  override state: State = { broken: null, revision: this.props.revision }

  static getDerivedStateFromError(error: unknown): Partial<State> {
    return { broken: error instanceof Error ? error.message : String(error) }
  }

  static getDerivedStateFromProps(props: Props, state: State): State | null {
    return props.revision === state.revision ? null : { broken: null, revision: props.revision }
  }

  override render(): ReactNode {
    if (this.state.broken === null) return this.props.children
    return (
      <p className="refusal">
        {this.props.what} broke and is not shown ({this.state.broken}). The formula itself is unharmed.
      </p>
    )
  }
}
