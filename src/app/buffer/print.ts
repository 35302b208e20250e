/** Prints the account of acid, base and buffer in place of the sheet. */
export function printBuffers(): void {
  const root = document.documentElement
  root.dataset['printing'] = 'buffers'
  addEventListener('afterprint', () => delete root.dataset['printing'], { once: true })
  window.print()
}
