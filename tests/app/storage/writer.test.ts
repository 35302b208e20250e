import { describe, expect, it } from 'vitest'
import { promptWriter } from '../../../src/app/storage/writer.ts'

describe('the prompt writer', () => {
  it('hands every state over at once and reports the newest when it is written', async () => {
    const handed: number[] = []
    const reported: number[] = []
    const writer = promptWriter<number>(
      async (state) => {
        handed.push(state)
        await Promise.resolve()
      },
      (state) => reported.push(state),
      () => undefined,
    )
    for (const state of [1, 2, 3]) writer.put(state)
    expect(handed).toEqual([1, 2, 3])
    await writer.settled()
    expect(reported).toEqual([3])
  })

  it('tells of a refused write and writes on', async () => {
    const refused: unknown[] = []
    const written: number[] = []
    const full = new Error('full')
    const writer = promptWriter<number>(
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
