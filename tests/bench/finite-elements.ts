/** An outline solved by FreeFem++, a general finite-element program: quadratic elements on a mesh refined on the arcs. Solid sections only. */
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { spawnSync } from 'node:child_process'
import type { Outline, OutlineEdge } from '#shared/torsion/outline/outline'
import { loopEdges } from '#shared/torsion/outline/outline'

export interface FiniteElementSolution {
  readonly J: number
  /** Greatest shear per G·θ′, mm. */
  readonly tau: number
  readonly triangles: number
  /** CPU time of mesh and solution as the program tells it, without its start, s. */
  readonly cpu: number
}

/** Elements on straight edges are `length` mm long, on arcs they sweep `angle` rad at most. */
export interface FiniteElementMesh { readonly length: number, readonly angle: number }

const program = 'FreeFem++'
export const hasFiniteElements = (): boolean => spawnSync('which', [program]).status === 0

function border({ a, b, arc, length }: OutlineEdge, index: number): string {
  const curve = arc
    ? `x=${arc.cx}+${arc.radius}*cos(${arc.startAngle}+s*${arc.sweep});y=${arc.cy}+${arc.radius}*sin(${arc.startAngle}+s*${arc.sweep});`
    : `x=${a.x}+s*${b.x - a.x};y=${a.y}+s*${b.y - a.y};`
  return `border e${index}(s=0,1){${curve}label=1;} // ${length} mm`
}

const divisions = ({ arc, length }: OutlineEdge, mesh: FiniteElementMesh): number =>
  Math.max(2, arc ? Math.ceil(Math.max(Math.abs(arc.sweep) / mesh.angle, length / mesh.length)) : Math.ceil(length / mesh.length))

function script(edges: readonly OutlineEdge[], mesh: FiniteElementMesh): string {
  return [
    'verbosity=0;', ...edges.map(border), 'real began=clock();',
    `mesh Th=buildmesh(${edges.map((edge, index) => `e${index}(${divisions(edge, mesh)})`).join('+')});`,
    'fespace Vh(Th,P2); Vh u,v;',
    'solve torsion(u,v,solver=sparsesolver)=int2d(Th)(dx(u)*dx(v)+dy(u)*dy(v))-int2d(Th)(2.*v)+on(1,u=0);',
    'fespace Gh(Th,P1dc); Gh gx=dx(u),gy=dy(u);',
    'real J=int2d(Th)(2.*u); real tau=0; for(int i=0;i<Gh.ndof;i++) tau=max(tau,sqrt(gx[][i]^2+gy[][i]^2));',
    'cout.precision(12); cout<<"solved "<<J<<" "<<tau<<" "<<Th.nt<<" "<<clock()-began<<endl;',
  ].join('\n')
}

/** @throws where the program gives no solution. */
export function finiteElements(outline: Outline, mesh: FiniteElementMesh): FiniteElementSolution {
  const folder = mkdtempSync(join(tmpdir(), 'torquill-bench-'))
  try {
    const file = join(folder, 'torsion.edp')
    writeFileSync(file, script(loopEdges(outline.outer), mesh))
    const { stdout } = spawnSync(program, ['-nw', '-v', '0', file], { encoding: 'utf8' })
    const [J, tau, triangles, cpu] = (/solved (\S+) (\S+) (\S+) (\S+)/.exec(stdout) ?? []).slice(1).map(Number)
    if (J === undefined || tau === undefined || triangles === undefined || cpu === undefined) throw new Error(`${program} gave no solution: ${stdout.slice(-400)}`)
    return { J, tau, triangles, cpu }
  } finally {
    rmSync(folder, { recursive: true, force: true })
  }
}
