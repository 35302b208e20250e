import { createHash } from 'node:crypto'
import { writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { build, type Plugin } from 'vite'
import { filesBelow, pageFile, read, singleFile } from './files.ts'

const hashOf = (text: string) => `'sha256-${createHash('sha256').update(text).digest('base64')}'`

/** Text inside a script element may not end it. `<\/` and `<\!` mean the same inside every JavaScript string. */
export const inScript = (code: string): string =>
  code.replaceAll(/<\/(script)/gi, '<\\/$1').replaceAll('<!--', '<\\!--')

/** A style sheet is cut loose from the files it came from; it may name none. */
export function inStyle(sheet: string): string {
  if (/url\(\s*['"]?(?!data:)/.test(sheet)) throw new Error('A style sheet of the page names a file.')
  if (/<\/style/i.test(sheet)) throw new Error('A style sheet of the page ends its own element.')
  return sheet
}

const workerId = 'calculation-worker'
const workerStart =
  /new Worker\(new URL\(new URL\(`[^`]*\.worker-[\w-]+\.js`,import\.meta\.url\)\.href,``\+import\.meta\.url\),\{type:`module`\}\)/g
const preloadList = /=>[\w$]+\.map\([\w$]+=>[\w$]+\[[\w$]+\]\)/g

/**
 * The worker comes from the page itself, and nothing is loaded ahead: there are no other files. A page opened from disk
 * may not start a module worker, so it is started as a classic script, which it is: it imports nothing.
 */
export function standingAlone(code: string): string {
  const alone = code
    .replaceAll(
      workerStart,
      `new Worker(URL.createObjectURL(new Blob([document.getElementById('${workerId}').textContent],{type:'text/javascript'})))`,
    )
    .replace(/const __vite__mapDeps=.*?\n/, (line) => line.replace(preloadList, '=>[]'))
  if (alone.includes('.worker-')) throw new Error('The worker could not be put into the single file.')
  if (/__vite__mapDeps=/.test(alone) && !/__vite__mapDeps=[^\n]*=>\[\]/.test(alone)) {
    throw new Error('A list of files to load ahead is left in the single file.')
  }
  return alone
}

/** All parts of the built page as one module. */
async function asOneModule(folder: string, entry: string): Promise<string> {
  const built = await build({
    configFile: false,
    root: folder,
    publicDir: false,
    logLevel: 'error',
    plugins: [{ name: 'standing-alone', transform: (code) => ({ code: standingAlone(code), map: null }) }],
    build: {
      write: false,
      minify: false,
      target: 'es2022',
      modulePreload: false,
      rolldownOptions: { input: join(folder, entry), output: { codeSplitting: false } },
    },
  })
  const outputs = [built].flat().flatMap((result) => ('output' in result ? result.output : []))
  const [only, ...others] = outputs
  if (only?.type !== 'chunk' || others.length > 0)
    throw new Error('The single file did not become one module.')
  return only.code
}

const policyFor = (script: string, styles: string) =>
  [
    "default-src 'none'",
    `script-src ${hashOf(script)}`,
    `style-src ${hashOf(styles)}`,
    'img-src data:',
    'worker-src blob:',
    "form-action 'none'",
    "base-uri 'none'",
  ].join('; ')

/** The built page in one file that opens from disk, worker, data and every later part included. */
export async function pageInOneFile(folder: string): Promise<string> {
  const page = read(folder, pageFile)
  const entry = /<script type="module"[^>]*src="\.\/([^"]+)"/.exec(page)?.[1]
  if (!entry) throw new Error('The built page names no script.')
  const files = filesBelow(folder)
  const script = inScript(await asOneModule(folder, entry))
  const styles = inStyle(sheetsOf(page, folder, files))
  const [workerFile, ...otherWorkers] = files.filter((path) => /\.worker-[\w-]+\.js$/.test(path))
  if (!workerFile || otherWorkers.length > 0) throw new Error('The single file holds exactly one worker.')
  const worker = read(folder, workerFile)
  if (/\bimport[\s.({*]|\bexport[\s{*]/.test(worker)) throw new Error('The worker is no classic script.')
  const icon = Buffer.from(read(folder, 'mark.svg')).toString('base64')
  return page
    .replace(
      /(http-equiv="Content-Security-Policy" content=")[^"]*/,
      (_, head: string) => head + policyFor(script, styles),
    )
    .replaceAll(/\s*<link rel="(?:modulepreload|manifest|stylesheet|icon)"[^>]*>/g, '')
    .replace(/\s*<script type="module"[^>]*><\/script>/, '')
    .replace(
      '</head>',
      () =>
        `  <link rel="icon" href="data:image/svg+xml;base64,${icon}">\n    <style>${styles}</style>\n  </head>`,
    )
    .replace(
      '</body>',
      () =>
        `  <script type="text/plain" id="${workerId}">${inScript(worker)}</script>\n    <script type="module">${script}</script>\n  </body>`,
    )
}

/** Those of the first load first, as the page has them; the later ones behind. */
function sheetsOf(page: string, folder: string, files: readonly string[]): string {
  const sheets = files.filter((path) => path.endsWith('.css'))
  const named = sheets.filter((path) => page.includes(path))
  const later = sheets.filter((path) => !named.includes(path))
  return [...named, ...later].map((path) => read(folder, path)).join('\n')
}

/** Writes the single file beside the page once that is built. */
export function pageAsOneFile(): Plugin {
  return {
    name: 'page-as-one-file',
    apply: 'build',
    writeBundle: {
      order: 'post',
      sequential: true,
      async handler({ dir }) {
        if (!dir) return this.error('The page has to be written to a folder.')
        const page = await pageInOneFile(dir)
        writeFileSync(join(dir, singleFile), page)
        this.info(`${singleFile} ${(page.length / 1000).toFixed(0)} kB`)
      },
    },
  }
}
