import type { DemoNote } from './demo-note'
import { playCheckSheet, playClosing, playJudgement, playRemark, playReply, playTicks } from './play-review'
import { playCreation, playOpening, playPass, playRelease, playReturn, playSubmission } from './play-states'
import { playAnswers, playMetadata, playReasons, playSave } from './play-writing'
import type { Stage } from './stage'
import { timelineOf, type Moment } from './timeline'

function playAct(stage: Stage, note: DemoNote, act: Extract<Moment, { what: 'act' }>['act']): Promise<void> {
  switch (act.act) {
    case 'save': return playSave(stage, note, act)
    case 'metadata': return playMetadata(stage, note, act)
    case 'answer': return playAnswers(stage, note, act)
    case 'explain': return playReasons(stage, note, act)
    case 'submit': return playSubmission(stage, note, act)
    case 'tick': return playTicks(stage, note, act)
    case 'judge': return playJudgement(stage, note, act)
    case 'check': return playCheckSheet(stage, note, act)
    case 'return': return playReturn(stage, note, act)
    case 'pass': return playPass(stage, note, act)
    case 'release': return playRelease(stage, note, act)
  }
}

function playMoment(stage: Stage, moment: Moment): Promise<void> {
  const { note, at, by } = moment
  switch (moment.what) {
    case 'create': return playCreation(stage, note)
    case 'open': return playOpening(stage, note, by, at)
    case 'remark': return playRemark(stage, note, moment.remark)
    case 'reply': return playReply(stage, note, moment.remark, { by, at, text: moment.text })
    case 'close': return playClosing(stage, note, moment.remark, at)
    case 'act': return playAct(stage, note, moment.act)
  }
}

async function playNote(stage: Stage, note: DemoNote): Promise<void> {
  for (const moment of timelineOf([note])) {
    await playMoment(stage, moment).catch((cause: unknown) => {
      const what = moment.what === 'act' ? moment.act.act : moment.what
      throw new Error(`${moment.note.number}, ${moment.at}, ${moment.by}, ${what}: ${cause instanceof Error ? cause.message : String(cause)}`, { cause })
    })
  }
}

/**
 * Plays every note from its first moment to its last. Notes share nothing but people, and each has a trail
 * of its own, so they are played side by side: while one waits for the database, another computes.
 * Says at which moment it stopped, if it stops.
 */
export async function play(stage: Stage, notes: DemoNote[]): Promise<void> {
  await Promise.all(notes.map(note => playNote(stage, note)))
}
