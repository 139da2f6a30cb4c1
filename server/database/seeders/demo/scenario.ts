/** What happened at the invented maker: one folder of `notes/` per note, with its calculations, its text and its story. Times are the scenario's own. */
import type { DemoNote } from './demo-note'
import { ANGLE_BRACKET } from './notes/angle-bracket/story'
import { RAIL_NOTE } from './notes/channel-rail/story'
import { HAT } from './notes/hat-stiffener/story'
import { LATCH_SHAFT } from './notes/latch-shaft/story'
import { LIPPED_CHANNEL } from './notes/lipped-channel/story'
import { TILT_FRAME_BAR } from './notes/tilt-frame-bar/story'
import { TORQUE_TUBE } from './notes/torque-tube/story'
import { TWO_CELL_BOX } from './notes/two-cell-box/story'

/** The notes in the order of their numbers. Acts of different notes do not touch each other. */
export const DEMO_NOTES: DemoNote[] = [HAT, TORQUE_TUBE, TWO_CELL_BOX, ANGLE_BRACKET, LIPPED_CHANNEL, RAIL_NOTE, LATCH_SHAFT, TILT_FRAME_BAR]
