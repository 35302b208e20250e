import { describe, expect, it } from 'vitest'
import { latestWriter } from '../../../src/app/storage/writer.ts'

describe('the writer of the latest state', () => {
  it('writes the first state at once and then only the newest that is waiting', async () => {
    const written: number[] = []
    const writer = latestWriter<number>(
      async (state) => {
        await Promise.resolve()
        written.push(state)
      },
      () => undefined,
      () => undefined,
    )
    for (const state of [1, 2, 3, 4]) writer.put(state)
    await writer.settled()
    expect(written).toEqual([1, 4])
  })

  it('tells of a refused write and writes on', async () => {
    const refused: unknown[] = []
    const written: number[] = []
    const full = new Error('full')
    const writer = latestWriter<number>(
      async (state) => {
        if (state === 1) throw full
      },
      (state) => written.push(state),
      (error) => refused.push(error),
    )
    writer.put(1)
    await writer.settled()
    writer.put(2)
    await writer.settled()
    expect(refused).toEqual([full])
    expect(written).toEqual([2])
  })
})
