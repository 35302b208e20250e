/** Brings the shelf into sight and the focus to it, as soon as it is drawn. */
export function goToShelf(): void {
  requestAnimationFrame(() => {
    const summary = document.getElementById('shelf-summary')
    summary?.scrollIntoView({ block: 'start' })
    summary?.focus({ preventScroll: true })
  })
}
