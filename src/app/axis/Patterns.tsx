const size = 8

interface Weave {
  readonly id: string
  /** Tokens of the ground, and whether the lines on it are light. */
  readonly ground: string
  readonly lightLines: boolean
  readonly draw: string
}

/* Dark and light grounds take turns, each with its own weave, so that neighbours differ in greyscale too. */
const weaves: readonly Weave[] = [
  { id: 'a', ground: 'var(--share-a)', lightLines: true, draw: '' },
  { id: 'b', ground: 'var(--share-b)', lightLines: false, draw: 'M-2 10 10 -2M-2 2 2 -2M6 10 10 6' },
  { id: 'c', ground: 'var(--share-c)', lightLines: true, draw: 'M2 2h.01M6 6h.01' },
  { id: 'd', ground: 'var(--share-d)', lightLines: false, draw: '' },
  { id: 'e', ground: 'var(--share-e)', lightLines: true, draw: 'M0 2h8M0 6h8' },
  { id: 'f', ground: 'var(--share-f)', lightLines: false, draw: 'M-2 -2 10 10M-2 6 2 10M6 -2 10 2' },
  { id: 'g', ground: 'var(--share-g)', lightLines: true, draw: 'M2 0v8M6 0v8' },
  { id: 'h', ground: 'var(--share-h)', lightLines: false, draw: 'M2 2h.01M6 6h.01' },
]

const weaveOf = (order: number): Weave => weaves[order % weaves.length] ?? (weaves[0] as Weave)

/** Fill of the line at `order` in the table, on the axis and in its swatch. */
export const weaveFill = (order: number) => `url(#weave-${weaveOf(order).id})`

/** Class that gives text on the weave a colour that can be read. */
export const weaveText = (order: number) => (weaveOf(order).lightLines ? 'on-dark' : 'on-light')

/** Definitions that every drawing of the page refers to. */
export function Patterns() {
  return (
    <svg className="patterns" width="0" height="0" aria-hidden="true" focusable="false">
      <defs>
        {weaves.map(({ id, ground, lightLines, draw }) => (
          <pattern key={id} id={`weave-${id}`} width={size} height={size} patternUnits="userSpaceOnUse">
            <rect width={size} height={size} fill={ground} />
            <path
              d={draw}
              fill="none"
              stroke={lightLines ? 'var(--share-line-light)' : 'var(--share-line-dark)'}
              strokeWidth={draw.includes('h.01') ? 2.2 : 1}
              strokeLinecap="round"
            />
          </pattern>
        ))}
        <pattern id="tolerated" width="7" height="7" patternUnits="userSpaceOnUse">
          <path d="M-1 8 8 -1M-1 1 1 -1M6 8 8 6" stroke="var(--accent)" strokeWidth="0.7" opacity="0.55" />
        </pattern>
      </defs>
    </svg>
  )
}

/** The mark of a line: its weave and its number in the table. */
export function Swatch({ order }: { readonly order: number }) {
  return (
    <svg className="swatch" width="22" height="22" viewBox="0 0 22 22" aria-hidden="true">
      <rect
        x="0.75"
        y="0.75"
        width="20.5"
        height="20.5"
        rx="2"
        fill={weaveFill(order)}
        className="swatch-edge"
      />
      <text x="11" y="15.4" textAnchor="middle" className={`swatch-number ${weaveText(order)}`}>
        {order + 1}
      </text>
    </svg>
  )
}
