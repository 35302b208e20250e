import type { TraceView } from '../state/traceViews.ts'

/** The arithmetic line by line, as a checker would write it. */
export function Trace({ steps }: { readonly steps: readonly TraceView[] }) {
  if (steps.length === 0) return null
  return (
    <ol className="trace">
      {steps.map((step) => (
        <li key={step.key}>
          {step.subject !== '' && <span className="trace-subject">{step.subject}</span>}
          <span className="trace-rule">{step.rule}</span>
          <span className="trace-inputs small soft">
            {step.inputs.map((input) => (
              <span key={input.text} className="trace-input">
                {input.text}
                {input.fromMemory && <em> from memory</em>}
              </span>
            ))}
          </span>
          <span className="trace-result">{step.result}</span>
        </li>
      ))}
    </ol>
  )
}
