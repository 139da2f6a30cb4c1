import { Window } from 'happy-dom'
import { describe, expect, it } from 'vitest'
import { angleInputs, bracketInputs, hatInputs, lippedChannelInputs, stripInputs } from '../../../factories/open-section'
import { rampColour, paletteOf } from '#shared/calc/drawing/svg-theme'
import { drawingToSvg } from '#shared/calc/drawing-svg'
import { evaluateCalculation } from '#shared/calc/registry'
import type { Drawing } from '#shared/calc/types'

function drawingOf(inputs: unknown): Drawing {
  const evaluation = evaluateCalculation({ kind: 'open-section', kindVersion: 1, inputs })
  if (!evaluation.ok || !evaluation.result.drawing) throw new Error('the sample has no drawing')
  return evaluation.result.drawing
}
const parsed = (svg: string) => {
  const { document } = new Window()
  document.body.innerHTML = svg
  return document
}

describe('drawing as SVG', () => {
  it('is one svg of the asked width, named by its alternative text, without scripts, styles or outside references', () => {
    for (const theme of ['light', 'dark', 'print'] as const) {
      const svg = drawingToSvg(drawingOf(hatInputs()), { width: 300, theme })
      expect(svg).toMatch(/^<svg xmlns="http:\/\/www\.w3\.org\/2000\/svg" width="300" height="[\d.]+" viewBox="0 0 300 [\d.]+" role="img" aria-label="[^"]+">.*<\/svg>$/)
      expect(svg).not.toMatch(/<script|<style|\sstyle=|href|url\(|var\(|NaN|undefined/)
    }
  })
  it('escapes every text that people give', () => {
    const drawing: Drawing = {
      box: { x: 0, y: 0, width: 10, height: 10 }, alt: '"><script>alert(1)</script>',
      shapes: [{ type: 'label', at: [1, 1], text: '<script>&"\'\u0000', role: 'note' }, { type: 'balloon', at: [2, 2], text: '</text><x>', leaderTo: [3, 3] }],
    }
    const svg = drawingToSvg(drawing, { width: 100, theme: 'light' })
    expect(svg).not.toMatch(/<script|<x>/)
    expect(svg).not.toContain('\u0000')
    expect(svg).toContain('&lt;script&gt;&amp;&quot;&#39;')
    expect(parsed(svg).querySelector('svg')?.getAttribute('aria-label')).toBe('"><script>alert(1)</script>')
  })
  it('names every wall, and shows peak, torque, centroid, shear centre and ramp', () => {
    const texts = [...parsed(drawingToSvg(drawingOf(lippedChannelInputs()), { width: 470, theme: 'light' })).querySelectorAll('text')].map(t => t.textContent)
    for (const seen of ['a', 'b', 'c', 'd', 'e', 'S', 'C', 'x', 'y', '80', '40', '16', 't 2.5', '5.20\u2009MPa peak', 'T 15.90\u2009lbf·in', '0', '4.80\u2009MPa']) expect(texts, seen).toContain(seen)
  })
  it('draws true to scale: the web of the channel spans 80 mm of the box', () => {
    const drawing = drawingOf(lippedChannelInputs())
    const web = drawing.shapes.find(s => s.type === 'path' && s.wall === 'c')
    const ys = web?.type === 'path' ? web.points.map(p => p[1]) : []
    // Half of each bend belongs to the web, so its outline ends inside the 80 mm between mid-lines plus one thickness.
    expect(Math.max(...ys) - Math.min(...ys)).toBeGreaterThan(75)
    expect(Math.max(...ys) - Math.min(...ys)).toBeLessThanOrEqual(82.5)
    const flat = drawingOf(stripInputs()).shapes.find(s => s.type === 'path')
    expect(flat?.type === 'path' ? Math.max(...flat.points.map(p => p[1])) : 0).toBeCloseTo(1, 12)
  })
  it('fills machined fillets and leaves bends to the wall outlines', () => {
    const loose = (inputs: unknown) => drawingOf(inputs).shapes.filter(s => s.type === 'path' && s.role === 'wall' && s.wall === undefined).length
    expect(loose(angleInputs())).toBe(1)
    expect(loose(hatInputs())).toBe(0)
  })
  it('sets the flag of the peak clear of axes, marks and walls', () => {
    for (const inputs of [angleInputs(), bracketInputs(), hatInputs(), lippedChannelInputs(), stripInputs()]) {
      const { shapes, box } = drawingOf(inputs)
      const flag = shapes.flatMap(s => s.type === 'peak' && s.flag ? [s.flag] : [])[0]
      if (!flag) throw new Error('the peak has no flag')
      // Lettering of 11.5 px over the line, in a picture of 470 px.
      const top = flag.knee[1] + 11.5 * box.width / 470
      const [left, right] = [Math.min(flag.knee[0], flag.end[0]), Math.max(flag.knee[0], flag.end[0])]
      const marks = shapes.flatMap(s => s.type === 'path' ? s.points : s.type === 'line' ? [s.from, s.to] : s.type === 'centroid' || s.type === 'shear-centre' || s.type === 'label' || s.type === 'balloon' ? [s.at] : [])
      expect(marks.filter(([x, y]) => x > left && x < right && y > flag.knee[1] && y < top)).toEqual([])
    }
  })
  it('carries no ramp when nothing is loaded', () => {
    const inputs = stripInputs()
    if (inputs.loading.by === 'torque') inputs.loading.torque.text = '0'
    expect(drawingOf(inputs).ramp).toBeUndefined()
  })
})

it('mixes the ramp between its nine steps and holds at its ends', () => {
  const light = paletteOf('light')
  expect(rampColour(light, 0)).toBe('#EDEBE0')
  expect(rampColour(light, 1)).toBe('#1C2733')
  expect(rampColour(light, 0.125)).toBe('#C3D4C9')
  expect(rampColour(light, -1)).toBe('#EDEBE0')
  expect(rampColour(light, 7)).toBe('#1C2733')
})
