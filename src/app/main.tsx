import { StrictMode } from 'react'
import { createRoot } from 'react-dom/client'
import './style/tokens.css'
import './style/base.css'
import { Page } from './page/Page.tsx'
import { PageProvider } from './state/context.tsx'
import type { Page as PageTools } from './state/store.ts'
import { startPage } from './start.ts'

const mount = document.getElementById('page')

function show(element: HTMLElement, page: PageTools) {
  createRoot(element).render(
    <StrictMode>
      <PageProvider page={page}>
        <Page />
      </PageProvider>
    </StrictMode>,
  )
}

/** Without its data the page has nothing to say but this. */
function tellFailure(element: HTMLElement, error: unknown) {
  const reason = error instanceof Error ? error.message : String(error)
  element.textContent = `Evenwater could not start and shows nothing rather than something wrong. ${reason}`
}

if (mount) {
  startPage().then(
    (page) => show(mount, page),
    (error: unknown) => tellFailure(mount, error),
  )
}
