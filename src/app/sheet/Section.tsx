import type { SheetSection } from '../../worksheet/types.ts'
import { CautionList } from './CautionList.tsx'
import { SheetTable } from './SheetTable.tsx'

/** One section of the sheet, by its kind. */
export function Section({ section }: { readonly section: SheetSection }) {
  return (
    <section className="paper-section" data-kind={section.kind} data-short={isShort(section) || undefined}>
      <h4>{section.heading}</h4>
      <Body section={section} />
    </section>
  )
}

/** Fits onto a page with ease, and is kept together there. */
const isShort = (section: SheetSection) => section.kind === 'table' && section.rows.length <= 8

function Body({ section }: { readonly section: SheetSection }) {
  switch (section.kind) {
    case 'fields':
      return <Fields fields={section.fields} />
    case 'table':
      return <SheetTable table={section} />
    case 'steps':
      return <Steps steps={section.steps} ticked={section.ticked} />
    case 'cautions':
      return <CautionList cautions={section.cautions} />
    case 'arithmetic':
      return <Lines lines={section.lines} />
    case 'text':
      return section.paragraphs.map((paragraph) => <p key={paragraph}>{paragraph}</p>)
    case 'label':
      return <Label name={section.name} lines={section.lines} />
  }
}

type Of<Kind extends SheetSection['kind']> = Extract<SheetSection, { kind: Kind }>

const Fields = ({ fields }: Pick<Of<'fields'>, 'fields'>) => (
  <dl className="paper-fields">
    {fields.map(({ label, value, limit, wide }) => (
      <div key={label} data-wide={wide || undefined}>
        <dt>{label}</dt>
        {value === null ? (
          <dd className="paper-blank">
            {limit ?? <span className="unseen">blank, to be filled in by hand</span>}
          </dd>
        ) : (
          <dd>{value}</dd>
        )}
      </div>
    ))}
  </dl>
)

const Steps = ({ steps, ticked }: Pick<Of<'steps'>, 'steps' | 'ticked'>) => (
  <ol className="paper-steps" data-ticked={ticked || undefined}>
    {steps.map(({ text, reason }) => (
      <li key={text}>
        <span className="paper-tick" aria-hidden="true" />
        <span>
          {text} <small>{reason}</small>
        </span>
        {ticked && <span className="paper-initials">time, initials</span>}
      </li>
    ))}
  </ol>
)

/* The same line may stand twice: two ingredients with the same figures. */
const Lines = ({ lines }: Pick<Of<'arithmetic'>, 'lines'>) => (
  <ul className="paper-lines">
    {lines.map((line, index) => (
      <li key={`${index} ${line}`}>{line}</li>
    ))}
  </ul>
)

const Label = ({ name, lines }: Pick<Of<'label'>, 'name' | 'lines'>) => (
  <div className="paper-label">
    <p>
      <strong>{name}</strong>
    </p>
    {lines.map((line, index) => (
      <p key={`${index} ${line}`}>{line}</p>
    ))}
  </div>
)
