/** What every reference row must keep to, so that it can be filed, found and compared between revisions. */
import { describe, expect, it } from 'vitest'
import { chapterOf, chapters, rowKey, sectionOf } from '../../reference/method-sections'
import { referenceRows } from '../../reference/rows'

describe('the reference rows', () => {
  it('each have a key of their own', () => {
    const keys = referenceRows.map(rowKey)
    expect(keys.filter((key, i) => keys.indexOf(key) !== i)).toEqual([])
  })

  it('each stand in a chapter of the methods and name their source', () => {
    expect(referenceRows.filter(row => !(chapterOf(sectionOf(row)) in chapters)).map(row => row.id)).toEqual([])
    expect(referenceRows.filter(row => !/\S/.test(row.source) || !/\S/.test(row.quantity)).map(rowKey)).toEqual([])
  })

  it('each expect a finite number within a tolerance that can be missed', () => {
    const blind = referenceRows.filter(({ expected, tolerance }) => !Number.isFinite(expected) || !(tolerance.value > 0) || (tolerance.kind === 'rel' && (expected === 0 || tolerance.value > 0.1)))
    expect(blind.map(rowKey)).toEqual([])
  })
})
