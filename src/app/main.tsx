import { StrictMode } from 'react'
import { createRoot } from 'react-dom/client'
import './style/tokens.css'
import './style/base.css'
import { Page } from './page/Page.tsx'
import { PageProvider } from './state/context.tsx'
import { startPage } from './start.ts'

const mount = document.getElementById('page')
if (mount) {
  void startPage().then((store) =>
    createRoot(mount).render(
      <StrictMode>
        <PageProvider store={store}>
          <Page />
        </PageProvider>
      </StrictMode>,
    ),
  )
}
