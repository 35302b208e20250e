import { existsSync, readFileSync, rmSync } from 'node:fs'
import { join } from 'node:path'
import { buildPage, install, root, run, runTool } from './steps.mjs'

const tally = { passed: 0, failed: 0 }

function step(title, ok) {
  console.log(`${ok ? 'ok' : 'FAILED'}  ${title}`)
  tally[ok ? 'passed' : 'failed'] += 1
}

function attempt(title, action) {
  try {
    step(title, action() !== false)
  } catch (problem) {
    console.error(problem.message)
    step(title, false)
  }
}

/** Adds a runner's own counts; a runner that left no report, or ran nothing, is a failure. */
function count(title, report, read, code) {
  if (!existsSync(report)) return step(title, false)
  const { passed, failed } = read(JSON.parse(readFileSync(report, 'utf8')))
  console.log(`${failed === 0 && code === 0 ? 'ok' : 'FAILED'}  ${title}: ${passed} passed, ${failed} failed`)
  tally.passed += passed
  tally.failed += failed
  if (passed + failed === 0 || (code !== 0 && failed === 0)) tally.failed += 1
}

function unitTests() {
  const report = join(root, 'node_modules', '.cache', 'evenwater', 'unit.json')
  rmSync(report, { force: true })
  const { code } = runTool('vitest', [
    'run',
    '--reporter=default',
    '--reporter=json',
    `--outputFile.json=${report}`,
  ])
  count('unit, data, literature and architecture tests', report, unitCounts, code)
}

const unitCounts = (result) => ({
  passed: result.numPassedTests,
  failed: result.numFailedTests + result.numPendingTests + result.numTodoTests,
})

function browserTests(chromium) {
  const report = join(root, 'node_modules', '.cache', 'evenwater', 'browser.json')
  rmSync(report, { force: true })
  const { code } = runTool(
    'playwright',
    ['test', '--config', 'e2e/playwright.config.ts', '--reporter=list,json'],
    {
      env: { CHROMIUM_PATH: chromium, PLAYWRIGHT_JSON_OUTPUT_NAME: report },
    },
  )
  count('end-to-end tests on the built page', report, browserCounts, code)
}

const browserCounts = ({ stats }) => ({
  passed: stats.expected,
  failed: stats.unexpected + stats.flaky + stats.skipped,
})

attempt('packages installed', install)
let chromium
if (tally.failed === 0) {
  const { findChromium } = await import('./chromium.mjs')
  attempt('browser found', () => {
    chromium = findChromium()
    console.log(`    ${chromium}`)
  })
  attempt('types', () => runTool('tsc', ['--noEmit']).code === 0)
  attempt('lint', () => runTool('oxlint', ['--deny-warnings']).code === 0)
  attempt('format', () => runTool('prettier', ['--check', '--log-level', 'warn', '.']).code === 0)
  attempt('page built', buildPage)
  attempt(
    'command line answers',
    () => run(process.execPath, ['.run/evaluate.mjs', '--build-only']).code === 0,
  )
  unitTests()
  if (chromium) browserTests(chromium)
}
console.log(`${tally.passed} passed, ${tally.failed} failed`)
process.exitCode = tally.failed === 0 ? 0 : 1
