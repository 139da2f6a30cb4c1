/** QSN-40-0015: a draft that has just begun. */
import { calc, ol, p, section, type DemoSection } from '../build-document'
import type { DemoCase } from '../load-cases'
import { QM_106 } from '../materials'
import { openSection, torqueCases, type SectionWords } from '../open-section-inputs'

const guess: DemoCase[] = [{ id: 'X01', title: 'First guess, to be replaced', source: 'none yet', value: '85', temperature: '20' }]

// A tee: the flange runs through, the stem stands on its middle.
const tee = (): SectionWords['geometry'] => {
  const mm = (text: string) => ({ text, unit: 'mm' as const })
  const at = (x: string, y: string) => ({ by: 'point' as const, x: mm(x), y: mm(y) })
  return {
    start: { x: mm('-60'), y: mm('0') },
    walls: [
      { id: 'a', name: 'flange, left', from: '1', to: '2', end: at('0', '0'), t: mm('8'), material: 'QM-106' },
      { id: 'b', name: 'flange, right', from: '2', to: '3', end: at('60', '0'), t: mm('8'), material: 'QM-106' },
      { id: 'c', name: 'stem', from: '2', to: '4', end: at('0', '-90'), t: mm('8'), material: 'QM-106' },
    ],
  }
}

const trial = () => openSection({
  units: 'SI', geometry: tee(), junctions: [{ node: '2', radius: { text: '8', unit: 'mm' }, make: 'machined' }], material: QM_106,
  loading: torqueCases(guess, 'N·m', '°C'), length: '940', partial: true, factorReason: 'QL8-SC-001 issue 1, paragraph 4: 1.5 on variable loads, 1.00 on yield; the ultimate strength is not used.',
})

export function crossBar(): DemoSection[] {
  return [
    section('scope', p('Cross bar of the tilt frame, QL8-3340-01.')),
    section('references', ol('Drawing QL8-3340-01, preliminary.', 'QL8-SC-001 issue 1, Structural criteria of the loader.', 'QM-MD-106 issue 2, material record QM-106.')),
    section('section-analysis', calc('C1', 'First trial: tee', trial()), p('First trial: torsion constant ⟦C1 J⟧, twist ⟦C1 twist_deg@X01⟧. The torque is a guess until the loads are known.')),
  ]
}
