import { fileURLToPath } from 'node:url'
import react from '@vitejs/plugin-react'
import type { Plugin } from 'vite'
import { defineConfig } from 'vitest/config'
import { firstLoadBudget } from './.run/page/firstLoad.ts'
import { offlineCopy } from './.run/page/offlineCopy.ts'
import { pageAsOneFile } from './.run/page/singleFile.ts'

const repository = fileURLToPath(new URL('.', import.meta.url))

/** Nothing is fetched, nothing is sent: the page may only use what it was built with. */
const contentSecurityPolicy = [
  "default-src 'none'",
  "script-src 'self'",
  "style-src 'self'",
  "img-src 'self' data:",
  "connect-src 'self'",
  "worker-src 'self'",
  "font-src 'self'",
  "manifest-src 'self'",
  "form-action 'none'",
  "base-uri 'none'",
].join('; ')

/** Writes the policy into the built page; the development server needs its own inline scripts. */
function policyInPage(): Plugin {
  return {
    name: 'policy-in-page',
    apply: 'build',
    transformIndexHtml: () => [
      {
        tag: 'meta',
        attrs: { 'http-equiv': 'Content-Security-Policy', content: contentSecurityPolicy },
        injectTo: 'head-prepend',
      },
    ],
  }
}

export default defineConfig({
  root: 'src',
  base: './',
  publicDir: '../public',
  cacheDir: '../.cache/vite',
  plugins: [
    react(),
    policyInPage(),
    firstLoadBudget(),
    offlineCopy(`${repository}src/app/offline/service-worker.ts`),
    pageAsOneFile(),
  ],
  build: {
    outDir: '../dist',
    emptyOutDir: true,
    target: 'es2022',
    modulePreload: { polyfill: false },
    assetsInlineLimit: 0,
    rolldownOptions: {
      output: {
        codeSplitting: {
          groups: [
            { name: 'react', test: /node_modules[\\/](react|react-dom|scheduler|zustand)[\\/]/, priority: 2 },
            {
              name: 'mathjs',
              test: /node_modules[\\/](mathjs|typed-function|decimal\.js|fraction\.js|complex\.js)[\\/]/,
              priority: 1,
            },
          ],
        },
      },
    },
  },
  worker: { format: 'es' },
  server: { fs: { allow: [repository] } },
  preview: {
    headers: { 'Content-Security-Policy': contentSecurityPolicy, 'X-Content-Type-Options': 'nosniff' },
  },
  test: {
    root: repository,
    include: ['tests/**/*.test.ts', 'tests/**/*.test.tsx'],
    environment: 'node',
    // The rooms are pure, so test files share one copy of the library in each thread.
    pool: 'threads',
    isolate: false,
    testTimeout: 20_000,
  },
})
