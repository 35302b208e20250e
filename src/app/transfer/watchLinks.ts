import { linkStart } from './linkStart.ts'
import type { LinkTools } from './openLink.ts'

/**
 * Opens the formula that the address of the page carries, now and whenever the address changes. The reading of
 * links is loaded only when there is one.
 */
export function watchLinks(tools: LinkTools): void {
  const open = async () => {
    const { hash, pathname, search } = location
    if (!hash.startsWith(linkStart)) return
    const { openLink } = await import('./openLink.ts')
    // Taken out of the address, so that a reload shows what was made of it since and not the link again.
    if (await openLink(hash, tools)) history.replaceState(null, '', `${pathname}${search}`)
  }
  addEventListener('hashchange', () => void open())
  void open()
}
