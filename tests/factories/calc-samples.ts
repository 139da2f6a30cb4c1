/**
 * Realistic inputs of every calculation kind, for what all kinds have to keep to: the contract test, the golden
 * results and the batch. A kind without samples here fails the contract test.
 */
import { boxInputs, finnedBoxInputs, inchTubeInputs, twoCellInputs } from './closed-section'
import { combinedInputs, panelInputs, powersInputs, steadyInputs } from './combined-stress'
import { boredPlateInputs, keyedShaftInputs, sharpBracketInputs, thickAngleInputs } from './general-outline'
import { followingChannelInputs, followingTubeInputs } from './imposed-twist'
import { angleInputs, bracketInputs, channelInputs, hatInputs, lippedChannelInputs, sheet2024, sheet6061, stripInputs } from './open-section'
import { hatProfileInputs, slitTubeProfileInputs, teeProfileInputs, zedProfileInputs } from './profile-inputs'
import { loadCasesInputs, materialInputs } from './records'
import { channelBarInputs, hatBarInputs, teeBarInputs } from './restrained-warping'
import { inchShaftInputs, sharedShaftInputs, steppedShaftInputs } from './torque-along-bar'
import { inchLoadsInputs, webLoadInputs } from './torque-from-loads'
import { flatShaftInputs, inchBarInputs, solidBarInputs, solidBarShapes } from './solid-bar'

/** A name says what the sample shows; each call makes fresh inputs. */
export type Samples = Record<string, () => unknown>

export const calcSamples: Record<string, Samples> = {
  'open-section': { strip: stripInputs, hat: hatInputs, 'lipped channel': () => lippedChannelInputs(), angle: angleInputs, channel: channelInputs, 'bracket in inches': bracketInputs, 'hat by profile': hatProfileInputs, 'tee by profile': teeProfileInputs, 'zed by profile in inches': zedProfileInputs, 'slit tube by profile': slitTubeProfileInputs },
  'closed-section': { 'box': boxInputs, 'two cells': twoCellInputs, 'tube in inches': inchTubeInputs, 'box with a lip': finnedBoxInputs },
  'general-outline': { 'thick angle': thickAngleInputs, 'sharp bracket': sharpBracketInputs, 'keyed shaft in inches': keyedShaftInputs, 'bored plate': boredPlateInputs },
  'solid-bar': { 'round bar': () => solidBarInputs(), 'flat shaft': flatShaftInputs, 'bar in inches': inchBarInputs, ...Object.fromEntries(Object.keys(solidBarShapes()).map(name => [name, () => solidBarShapes()[name]])) },
  'torque-from-loads': { 'load in a web': webLoadInputs, 'loads in inches': inchLoadsInputs },
  'torque-along-bar': { 'stepped shaft': steppedShaftInputs, 'shared shaft': sharedShaftInputs, 'shaft in inches': inchShaftInputs },
  'imposed-twist': { 'following channel': followingChannelInputs, 'following tube in inches': followingTubeInputs },
  'combined-stress': { 'two fibres': combinedInputs, 'panel': panelInputs, 'steady part': steadyInputs, 'powers': powersInputs },
  'margin-table': { 'least of each mode': () => ({ rows: 'least of each mode' }) },
  'restrained-warping': { 'channel': () => channelBarInputs(), 'hat with springs': hatBarInputs, 'tee in inches': teeBarInputs },
  'material': { 'sheet': materialInputs, 'sheet with knock-down': sheet2024, 'another sheet': sheet6061 },
  'load-cases': { 'torques and forces': loadCasesInputs },
}

/** Every sample with the kind it is of. */
export const allSamples = (): { kind: string, name: string, inputs: unknown }[] =>
  Object.entries(calcSamples).flatMap(([kind, samples]) => Object.entries(samples).map(([name, make]) => ({ kind, name, inputs: make() })))
