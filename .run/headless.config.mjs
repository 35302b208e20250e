import { defineConfig } from 'vite'

/* The command-line run as one file, so that it starts at once. */
export default defineConfig({
  root: 'src',
  logLevel: 'error',
  publicDir: false,
  ssr: { noExternal: true },
  build: {
    ssr: 'app/headless/main.ts',
    outDir: '../node_modules/.cache/evenwater/headless',
    emptyOutDir: true,
    target: 'node20',
    minify: false,
    rolldownOptions: { output: { entryFileNames: 'evaluate.mjs', codeSplitting: false } },
  },
})
