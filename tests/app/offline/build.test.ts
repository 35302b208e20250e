import { randomBytes } from 'node:crypto'
import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterEach, describe, expect, it } from 'vitest'
import {
  firstLoad,
  firstLoadBudget,
  firstLoadBudgetKb,
  namedIn,
  totalKb,
} from '../../../.run/page/firstLoad.ts'
import { copyOf } from '../../../.run/page/offlineCopy.ts'
import { inScript, inStyle, standingAlone } from '../../../.run/page/singleFile.ts'

const page = `<script type="module" crossorigin src="./assets/start.js"></script>
  <link rel="modulepreload" crossorigin href="./assets/part.js">
  <link rel="stylesheet" crossorigin href="./assets/look.css">
  <link rel="manifest" href="./manifest.webmanifest">`

describe('the first load', () => {
  const files = [
    { fileName: 'index.html', content: page, needs: namedIn(page) },
    { fileName: 'assets/start.js', content: randomBytes(3000), needs: ['assets/part.js'] },
    { fileName: 'assets/part.js', content: randomBytes(2000), needs: ['assets/start.js'] },
    { fileName: 'assets/look.css', content: '.a{}', needs: [] },
    { fileName: 'assets/later.js', content: randomBytes(90_000), needs: [] },
  ]

  it('is the page with what it names and what that imports, each once, gzipped', () => {
    const needed = firstLoad(files, 'index.html')
    expect(needed.map(({ fileName }) => fileName)).toEqual([
      'assets/start.js',
      'assets/part.js',
      'index.html',
      'assets/look.css',
    ])
    expect(totalKb(needed)).toBeGreaterThan(5)
    expect(totalKb(needed)).toBeLessThan(5.6)
  })

  it('cannot be weighed without one of its files', () => {
    expect(() => firstLoad(files.slice(0, 2), 'index.html')).toThrow(/assets\/part.js is needed/)
  })

  const build = (budgetKb: number) => {
    const bundle = Object.fromEntries(
      files.map(({ fileName, content, needs }) => [
        fileName,
        fileName.endsWith('.js')
          ? { type: 'chunk', fileName, code: content, imports: needs }
          : { type: 'asset', fileName, source: content },
      ]),
    )
    const context = {
      info: (text: string) => text,
      error: (text: string) => {
        throw new Error(text)
      },
    }
    const { generateBundle } = firstLoadBudget(budgetKb) as unknown as {
      generateBundle: { handler(this: typeof context, options: unknown, bundle: unknown): string }
    }
    return generateBundle.handler.call(context, {}, bundle)
  }

  it('fails the build above its budget and names the heaviest file', () => {
    expect(build(6)).toMatch(/^First load 5\.\d of 6 kB gzipped, 4 files$/)
    expect(() => build(5)).toThrow(/over the budget\.\n {2}3\.0 kB {2}assets\/start\.js/)
    expect(firstLoadBudgetKb).toBeLessThanOrEqual(220)
  })
})

describe('the list of the copy', () => {
  const folder = mkdtempSync(join(tmpdir(), 'evenwater-'))
  afterEach(() => rmSync(folder, { recursive: true, force: true }))

  it('holds every file of the page with its hash, and a mark that changes with any of them', () => {
    mkdirSync(join(folder, 'assets'), { recursive: true })
    const write = (path: string, text: string) => writeFileSync(join(folder, path), text)
    write('index.html', 'a')
    write('assets/one.js', 'b')
    write('service-worker.js', 'c')
    write('evenwater.html', 'd')
    const before = copyOf(folder)
    expect(before.files.map(({ path }) => path)).toEqual(['assets/one.js', ''])
    expect(before.files[1]?.sha256).toBe('ca978112ca1bbdcafac231b39a23dc4da786eff8147c4e72b9807785afee48bb')
    write('evenwater.html', 'other')
    expect(copyOf(folder).version).toBe(before.version)
    write('assets/one.js', 'other')
    expect(copyOf(folder).version).not.toBe(before.version)
  })
})

describe('the single file', () => {
  const start =
    'const go=()=>new Worker(new URL(new URL(`calculation.worker-A1_b.js`,import.meta.url).href,``+import.meta.url),{type:`module`});'

  it('starts its worker from itself and loads nothing ahead', () => {
    const code = `const __vite__mapDeps=(i,m=__vite__mapDeps,d=(m.f||(m.f=["./a.js"])))=>i.map(i=>d[i]);\n${start}`
    const alone = standingAlone(code)
    expect(alone).toContain(
      "new Worker(URL.createObjectURL(new Blob([document.getElementById('calculation-worker')",
    )
    expect(alone).toContain('=>[];')
    expect(alone).not.toContain('calculation.worker-')
  })

  it('is refused when a worker is started or files are listed in another way', () => {
    expect(() => standingAlone('new Worker("x.worker-A1.js")')).toThrow(/worker could not be put/)
    expect(() => standingAlone('const __vite__mapDeps=other("./a.js")\n')).toThrow(/list of files/)
  })

  it('keeps text from ending its own element', () => {
    expect(inScript('a="</script>";b="<!--"')).toBe('a="<\\/script>";b="<\\!--"')
    expect(() => inStyle('.a{background:url(x.png)}')).toThrow(/names a file/)
    expect(inStyle('.a{background:url(data:image/png;base64,AA)}')).toContain('data:')
  })
})
