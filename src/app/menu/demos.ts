/* Read as text and through the same door as any file of a stranger. */
const texts = import.meta.glob<string>('../../../data/demos/*.json', { query: '?raw', import: 'default' })

const names: Readonly<Record<string, string>> = {
  'eye-drop': 'Eye drop',
  'nasal-spray': 'Nasal spray',
  'nebuliser-solution': 'Nebuliser solution',
  'intravenous-electrolytes': 'Intravenous electrolytes',
  irrigation: 'Irrigation',
  'low-dose-eye-drop': 'Low-dose eye drop',
  'neonatal-infusion': 'Neonatal infusion',
}

export interface DemoOrder {
  readonly id: string
  readonly name: string
  readonly load: () => Promise<string>
}

/** Invented orders to look around with. */
export const demoOrders: readonly DemoOrder[] = Object.entries(texts).map(([path, load]) => {
  const id = path.replace(/^.*\/|\.json$/g, '')
  return { id, name: names[id] ?? id, load }
})
