import { describe, expect, it } from 'vitest'
import { originOf } from '../../../src/app/shelf/origin.ts'
import { standingOf } from '../../../src/app/shelf/standing.ts'
import { memoryFormulas, windowOn } from './fixtures.ts'

const kindOf = ({ page, shelf }: ReturnType<typeof windowOn>) =>
  standingOf(page.store.getState(), shelf.getState().formulas).kind

describe('keeping on the shelf', () => {
  it('makes one formula, then versions of it, each with its note', async () => {
    const { formulas, records } = memoryFormulas()
    const desk = windowOn(formulas, [['mannitol', '5 %']])
    await desk.actions.keepOnShelf('first')
    expect(kindOf(desk)).toBe('as-kept')
    await desk.actions.keepOnShelf('again')
    desk.typeTitle('Wash')
    expect(kindOf(desk)).toBe('changed')
    await desk.actions.keepOnShelf('named')
    expect(records.size).toBe(1)
    const [kept] = records.values()
    expect(kept?.title).toBe('Wash')
    expect(kept?.versions.map(({ note }) => note)).toEqual(['first', 'named'])
  })

  it('follows the sheet through undo and redo', async () => {
    const { formulas } = memoryFormulas()
    const desk = windowOn(formulas, [['mannitol', '5 %']])
    await desk.actions.keepOnShelf()
    const first = originOf(desk.page.store.getState())
    desk.page.actions.startNew()
    expect(originOf(desk.page.store.getState())).toBeNull()
    desk.typeTitle('Second')
    await desk.actions.keepOnShelf()
    const second = originOf(desk.page.store.getState())
    expect(second?.id).not.toBe(first?.id)
    desk.page.actions.undo()
    desk.page.actions.undo()
    expect(originOf(desk.page.store.getState())).toEqual(first)
    expect(kindOf(desk)).toBe('as-kept')
    desk.page.actions.redo()
    expect(originOf(desk.page.store.getState())).toEqual(second)
  })

  it('still knows where the sheet comes from when the step that opened it is forgotten', async () => {
    const { formulas } = memoryFormulas()
    const desk = windowOn(formulas)
    desk.page.actions.startNew()
    desk.typeTitle('Long work')
    desk.page.actions.leaveCell()
    await desk.actions.keepOnShelf()
    const origin = originOf(desk.page.store.getState())
    for (let step = 0; step < 1100; step += 1) desk.page.actions.setRoute(step % 2 === 0 ? 'nasal' : 'otic')
    expect(desk.page.store.getState().past.some(({ intention }) => intention.startsWith('replace'))).toBe(
      false,
    )
    expect(originOf(desk.page.store.getState())).toEqual(origin)
  })

  it('is taken back and done again as one step', async () => {
    const { formulas, records } = memoryFormulas()
    const desk = windowOn(formulas, [['mannitol', '5 %']])
    await desk.actions.keepOnShelf()
    await desk.actions.undoShelf()
    expect(records.size).toBe(0)
    expect(kindOf(desk)).toBe('not-kept')
    await desk.actions.redoShelf()
    expect(records.size).toBe(1)
    expect(kindOf(desk)).toBe('as-kept')
  })

  it('does nothing when the storage is full, and says so', async () => {
    const { formulas, records } = memoryFormulas(() => new DOMException('full', 'QuotaExceededError'))
    const desk = windowOn(formulas, [['mannitol', '5 %']])
    expect(await desk.actions.keepOnShelf()).toBe(false)
    expect(records.size).toBe(0)
    expect(desk.shelf.getState().status).toMatchObject({ kind: 'refused' })
    expect(desk.page.store.getState().formula.lines).toHaveLength(1)
    expect(await desk.actions.keepBeforeOther()).toBe('refused')
  })
})

describe('two windows', () => {
  it('never overwrite each other: the later one is asked', async () => {
    const { formulas, records } = memoryFormulas()
    const first = windowOn(formulas, [['mannitol', '5 %']])
    await first.actions.keepOnShelf()
    const second = windowOn(formulas)
    await second.actions.read()
    const [kept] = second.shelf.getState().formulas
    await second.actions.openKept(kept?.id ?? '')
    second.typeTitle('By the second')
    await second.actions.keepOnShelf()

    first.typeTitle('By the first')
    expect(await first.actions.keepOnShelf()).toBe(false)
    expect([...records.values()].map(({ title }) => title)).toEqual(['By the second'])
    expect(first.shelf.getState().conflict).toBe(kept?.id)
    await first.actions.keepOnShelf('', 'copy')
    expect([...records.values()].map(({ title }) => title)).toEqual(['By the second', 'By the first'])
  })

  it('do not undo over what the other did since', async () => {
    const { formulas, records } = memoryFormulas()
    const first = windowOn(formulas, [['mannitol', '5 %']])
    await first.actions.keepOnShelf()
    const [kept] = records.values()
    const second = windowOn(formulas)
    await second.actions.read()
    await second.actions.setArchived(kept?.id ?? '', true)
    await first.actions.undoShelf()
    expect(records.get(kept?.id ?? '')?.archived).toBe(true)
    expect(first.shelf.getState().said).toContain('Another window')
  })
})

describe('records of the shelf', () => {
  it('are copied, archived, deleted and brought back byte for byte', async () => {
    const { formulas, records } = memoryFormulas()
    const desk = windowOn(formulas, [['mannitol', '5 %']])
    desk.typeTitle('One')
    await desk.actions.keepOnShelf()
    const [kept] = records.values()
    const id = kept?.id ?? ''
    const before = JSON.stringify([...records])
    for (const deed of [
      () => desk.actions.copy(id),
      () => desk.actions.setArchived(id, true),
      () => desk.actions.remove(id),
    ]) {
      await deed()
      expect(JSON.stringify([...records])).not.toBe(before)
      await desk.actions.undoShelf()
      expect(JSON.stringify([...records])).toBe(before)
    }
  })

  it('give an earlier version to the desk, and keep all versions when it becomes the newest', async () => {
    const { formulas, records } = memoryFormulas()
    const desk = windowOn(formulas, [['mannitol', '5 %']])
    await desk.actions.keepOnShelf('old')
    desk.page.actions.setRoute('nasal')
    await desk.actions.keepOnShelf('new')
    const [kept] = records.values()
    await desk.actions.openKept(kept?.id ?? '', kept?.versions[0]?.stamp)
    expect(desk.page.store.getState().formula.route).toBe('ophthalmic')
    await desk.actions.keepOnShelf('back to the old')
    const notes = [...records.values()][0]?.versions.map(({ note }) => note)
    expect(notes).toEqual(['old', 'new', 'back to the old'])
  })

  it('are not doubled by what is kept before another document comes', async () => {
    const { formulas, records } = memoryFormulas()
    const desk = windowOn(formulas, [['mannitol', '5 %']])
    expect(await desk.actions.keepBeforeOther()).toBe('kept')
    expect(await desk.actions.keepBeforeOther()).toBe('nothing')
    desk.page.actions.startNew()
    expect(await desk.actions.keepBeforeOther()).toBe('nothing')
    expect(records.size).toBe(1)
  })
})
