import { describe, expect, it } from 'vitest'
import { evaluateNote } from '#shared/calc/evaluate-note'
import type { CalcResult, Evaluation, Guard } from '#shared/calc/types'
import { calculationsOf, tiedValuesOf } from '#shared/note/calculations'
import { readDocument } from '#shared/note/schema'
import { scanLooseNumbers } from '#shared/note/loose-numbers'
import { unfinishedSections } from '#shared/note/sections'
import { buildDocument, labelsOf, type DemoSection } from '#server/database/seeders/demo/build-document'
import type { DemoAct, DemoNote } from '#server/database/seeders/demo/demo-note'
import { answerFor } from '#server/database/seeders/demo/answers'
import { reasonFor } from '#server/database/seeders/demo/loose-reasons'
import { DEMO_NOTES } from '#server/database/seeders/demo/scenario'

type Issue = DemoNote['issues'][number]
const saves = (issue: Issue) => issue.acts.flatMap((act: DemoAct) => act.act === 'save' ? [act.sections] : [])
const submitted = (issue: Issue) => issue.acts.some(act => act.act === 'submit')
const released = (issue: Issue) => issue.acts.some(act => act.act === 'release')

/** The document as an issue last stood, with the evaluations by the name of the calculation. */
function lastOf(note: DemoNote, issue: Issue) {
  const all = saves(issue)
  return evaluated(note, all[all.length - 1] ?? [])
}

function evaluated(note: DemoNote, sections: DemoSection[]) {
  const doc = readDocument(buildDocument(note.number, sections))
  const names = [...labelsOf(sections).keys()]
  const calculations = calculationsOf(doc).map((one, index) => ({ ...one, note: note.number, name: names[index] ?? '' }))
  const evaluations = new Map<string, Evaluation>(Object.entries(evaluateNote(calculations).results))
  const results = new Map<string, CalcResult>(calculations.flatMap(({ id, name }) => {
    const evaluation = evaluations.get(id)
    return evaluation?.ok === true ? [[name, evaluation.result] as const] : []
  }))
  return { doc, calculations, evaluations, results }
}

const ISSUES = DEMO_NOTES.flatMap(note => note.issues.map(issue => ({ name: `${note.number} ${issue.letter}`, note, issue })))

const toAnswer = (guard: Guard) => guard.severity === 'caution' || (guard.severity === 'stop' && guard.deviable)

describe.each(ISSUES)('$name', ({ note, issue }) => {
  it('evaluates every calculation, with no warning from what it cannot give', () => {
    for (const sections of saves(issue)) {
      const { calculations, evaluations } = evaluated(note, sections)
      for (const { label, id } of calculations) expect(evaluations.get(id), `${label}`).toMatchObject({ ok: true })
    }
  })

  it('ties nothing to an output that does not exist', () => {
    for (const sections of saves(issue)) {
      const { doc, evaluations } = evaluated(note, sections)
      const broken = tiedValuesOf(doc).filter(({ calcId, key }) => {
        const evaluation = evaluations.get(calcId)
        return evaluation?.ok !== true || !evaluation.result.outputs.some(output => output.key === key)
      })
      expect(broken.map(one => `${one.sectionKey}: ${one.key}`)).toEqual([])
    }
  })
})

describe.each(ISSUES.filter(({ issue }) => submitted(issue)))('$name', ({ note, issue }) => {
  it('can be submitted: sections written, cautions answered, no stop left', () => {
    const { doc, calculations, evaluations } = lastOf(note, issue)
    expect(unfinishedSections(doc)).toEqual([])
    const open = calculations.flatMap((one) => {
      const evaluation = evaluations.get(one.id)
      const guards = evaluation?.ok === true ? evaluation.result.guards : []
      return guards.filter(guard => guard.severity === 'stop' ? !guard.deviable || answerFor(issue.acts, one, guard) === null : toAnswer(guard) && answerFor(issue.acts, one, guard) === null)
        .map(guard => `${one.name} ${guard.key} ${guard.severity}: ${guard.message}`)
    })
    expect(open).toEqual([])
  })
})

describe.each(ISSUES.filter(({ issue }) => submitted(issue)))('$name', ({ note, issue }) => {
  const reasons = issue.acts.flatMap(act => act.act === 'explain' ? act.reasons : [])

  it('explains every typed quantity that is tied to nothing', () => {
    const { doc, evaluations } = lastOf(note, issue)
    const open = scanLooseNumbers(doc, Object.fromEntries(evaluations), { noteTitle: note.title }).filter(one => reasonFor(doc, reasons, one) === null)
    expect(open.map(one => `${one.text}: ${one.reason}`)).toEqual([])
  })

  it('holds no number that a calculation contradicts, but for the one that was planted', () => {
    const { doc, evaluations } = lastOf(note, issue)
    const wrong = scanLooseNumbers(doc, Object.fromEntries(evaluations), { noteTitle: note.title }).filter(one => one.verdict === 'disagreeing')
    expect(wrong.map(one => one.text)).toEqual(note.number === 'QSN-40-0009' ? ['165.1×10⁶ N·mm²'] : [])
  })
})

describe.each(ISSUES.filter(({ issue }) => released(issue)))('$name', ({ note, issue }) => {
  it('is released with no stop that cannot be met, and with margins that hold', () => {
    for (const result of lastOf(note, issue).results.values()) {
      expect(result.guards.filter(guard => guard.severity === 'stop' && !guard.deviable)).toEqual([])
      expect(result.margins.filter(row => row.ms !== null && row.ms < 0)).toEqual([])
    }
  })
})

describe.each(ISSUES)('$name', ({ note, issue }) => {
  it('answers no guard that does not fire, and none twice', () => {
    let sections: DemoSection[] = []
    const idle: string[] = []
    for (const act of issue.acts) {
      if (act.act === 'save') sections = act.sections
      if (act.act !== 'answer') continue
      const fired = [...evaluated(note, sections).results].flatMap(([calc, result]) => result.guards.filter(toAnswer).map(guard => ({ calc, guard })))
      for (const answer of act.answers) {
        const met = fired.filter(({ calc, guard }) => (answer.calc === '*' || answer.calc === calc) && (answer.guard === guard.id || answer.guard === guard.key))
        if (met.length === 0) idle.push(`${answer.calc} ${answer.guard}`)
      }
      expect(new Set(act.answers.map(answer => `${answer.calc} ${answer.guard}`)).size).toBe(act.answers.length)
    }
    expect(idle).toEqual([])
  })
})
