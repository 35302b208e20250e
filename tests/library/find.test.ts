import { describe, expect, it } from 'vitest'
import { findIngredients } from '../../src/library/find.ts'
import { loadLibrary } from '../../src/library/library.ts'
import { distanceOfPrefix } from '../../src/library/spelling.ts'

const library = loadLibrary()
const first = (text: string) => findIngredients(library, text)[0]?.ingredient.id

describe('finding an ingredient', () => {
  it.each([
    // misspelt
    ['pilocrapine', 'pilocarpine-hydrochloride'],
    ['pilocarpin nitrate', 'pilocarpine-nitrate'],
    ['atropin sulfat', 'atropine-sulfate-monohydrate'],
    ['benzalkonim', 'benzalkonium-chloride'],
    ['benzylkonium chloride', 'benzalkonium-chloride'],
    ['sodum chloride', 'sodium-chloride'],
    ['sodium cloride', 'sodium-chloride'],
    ['potasium chloride', 'potassium-chloride'],
    ['phenilephrine', 'phenylephrine-hydrochloride'],
    ['chlorampenicol', 'chloramphenicol'],
    ['gentamycin', 'gentamicin-sulfate'],
    ['vancomicin', 'vancomycin-hydrochloride'],
    ['ketorolak', 'ketorolac-tromethamine'],
    ['hydroxipropylbetadex', 'hydroxypropylbetadex'],
    ['manitol', 'mannitol'],
    ['trometamine', 'tromethamine'],
    ['poloxmer', 'poloxamer-407'],
    ['ciprofloxcain', 'ciprofloxacin-hydrochloride-monohydrate'],
    ['dexametasone', 'dexamethasone-sodium-phosphate'],
    ['flourescein', 'fluorescein-sodium'],
    ['magnesum sulfate hepta', 'magnesium-sulfate-heptahydrate'],
    ['calcium gluconat', 'calcium-gluconate-monohydrate'],
    // synonyms
    ['noradrenaline', 'norepinephrine-bitartrate-monohydrate'],
    ['adrenaline tartrate', 'epinephrine-bitartrate'],
    ['albuterol', 'salbutamol-sulfate'],
    ['pethidine', 'meperidine-hydrochloride'],
    ['lignocaine hydrochloride', 'lidocaine-hydrochloride-monohydrate'],
    ['hyoscine', 'scopolamine-hydrobromide-trihydrate'],
    ['borax', 'sodium-borate-decahydrate'],
    ['glycerol', 'glycerin'],
    ['glucose monohydrate', 'dextrose-monohydrate'],
    ['vitamin c', 'ascorbic-acid'],
    ['niacinamide', 'nicotinamide'],
    ['hpmc', 'hypromellose'],
    ['peg 400', 'macrogol-400'],
    ['bak', 'benzalkonium-chloride'],
    ['edta', 'edetate-disodium-dihydrate'],
    ['dmso', 'dimethyl-sulfoxide'],
    ['thiomersal', 'thimerosal'],
    ['aluminium potassium sulphate', 'aluminum-potassium-sulfate-dodecahydrate'],
    // number, formula, part of a word
    ['7647-14-5', 'sodium-chloride'],
    ['10043-35', 'boric-acid'],
    ['nacl', 'sodium-chloride'],
    ['KCl', 'potassium-chloride'],
    ['zinc sul', 'zinc-sulfate-heptahydrate'],
    ['dibasic hepta', 'sodium-phosphate-dibasic-heptahydrate'],
  ])('%s → %s', (typed, id) => {
    expect(first(typed)).toBe(id)
  })

  it('lists by role', () => {
    const preservatives = findIngredients(library, 'preservative', 60)
    expect(preservatives.length).toBeGreaterThan(20)
    expect(preservatives[0]?.ingredient.roles.join()).toContain('preservative')
  })

  it('finds the commonest in at most five letters', () => {
    for (const [typed, id] of [
      ['nacl', 'sodium-chloride'],
      ['kcl', 'potassium-chloride'],
      ['bori', 'boric-acid'],
      ['glyce', 'glycerin'],
      ['manni', 'mannitol'],
      ['bak', 'benzalkonium-chloride'],
      ['edeta', 'edetate-disodium-dihydrate'],
      ['bicar', 'sodium-bicarbonate'],
      ['magne', 'magnesium-sulfate-heptahydrate'],
      ['calci', 'calcium-chloride-dihydrate'],
      ['pilo', 'pilocarpine-hydrochloride'],
      ['atro', 'atropine-sulfate-monohydrate'],
      ['lido', 'lidocaine-hydrochloride-monohydrate'],
      ['epine', 'epinephrine-hydrochloride'],
      ['water', 'water-for-injection'],
      ['citra', 'sodium-citrate-dihydrate'],
      ['polys', 'polysorbate-80'],
      ['hypro', 'hypromellose'],
      ['dext', 'dextrose-monohydrate'],
      ['pheny', 'phenylephrine-hydrochloride'],
    ]) {
      expect(first(typed ?? ''), typed).toBe(id)
    }
  })

  it('finds nothing for nothing or nonsense, and keeps to the limit', () => {
    expect(findIngredients(library, '')).toEqual([])
    expect(findIngredients(library, '  -- ')).toEqual([])
    expect(findIngredients(library, 'qqqqqqqq')).toEqual([])
    expect(findIngredients(library, 'sodium', 3)).toHaveLength(3)
    expect(findIngredients(library, 'x'.repeat(10_000))).toEqual([])
  })

  it('counts a wrong, a missing, an extra and a swapped letter as one error', () => {
    expect(distanceOfPrefix('pilocrapine', 'pilocarpine', 2)).toBe(1)
    expect(distanceOfPrefix('pilicarpine', 'pilocarpine', 2)).toBe(1)
    expect(distanceOfPrefix('pilcarpine', 'pilocarpine', 2)).toBe(1)
    expect(distanceOfPrefix('pillocarpine', 'pilocarpine', 2)).toBe(1)
    expect(distanceOfPrefix('piloc', 'pilocarpine', 2)).toBe(0)
    expect(distanceOfPrefix('tromethamine', 'pilocarpine', 2)).toBeNull()
  })
})
