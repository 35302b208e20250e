/** Prints the comparison in place of the sheet: the style rules leave only it on the paper meanwhile. */
export function printComparison(): void {
  const root = document.documentElement
  root.dataset['printing'] = 'comparison'
  addEventListener('afterprint', () => delete root.dataset['printing'], { once: true })
  window.print()
}
