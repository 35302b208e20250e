import { once } from 'node:events'
import { loadLibrary } from '../../library/library.ts'
import { answerFile } from './run.ts'

const usage = 'Name at least one formula file: npm run --silent evaluate -- FILE [FILE …]'

/** Prints one answer per file in order and stops at the first file that is no formula. */
async function main(files: readonly string[]): Promise<number> {
  if (files.length === 0) {
    process.stderr.write(`${usage}\n`)
    return 2
  }
  const library = loadLibrary()
  for (const file of files) {
    const answered = answerFile(file, library)
    if (!answered.ok) {
      process.stderr.write(`${answered.sentence.replaceAll(/\s+/g, ' ')}\n`)
      return 2
    }
    if (!process.stdout.write(`${answered.json}\n`)) await once(process.stdout, 'drain')
  }
  return 0
}

/* A reader that has seen enough closes the pipe; that is no fault of ours. */
process.stdout.on('error', (problem: NodeJS.ErrnoException) => {
  if (problem.code === 'EPIPE') process.exit(0)
  throw problem
})

process.exitCode = await main(process.argv.slice(2))
