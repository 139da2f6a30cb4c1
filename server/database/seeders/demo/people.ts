/** The invented maker's people and projects. Nothing here names a real person, aircraft or machine. */
import type { ProjectRole } from '#server/database/entities/project-member'

export const DEMO_MAKER = 'Quellmark Airframe Works'
/** One password for all demonstration people; the launcher prints it. The demonstration listens on loopback only. */
export const DEMO_PASSWORD = 'Hat-stiffener-31'

export const PROJECT_CODES = ['QW-19', 'QL-8'] as const
export type ProjectCode = (typeof PROJECT_CODES)[number]

export interface DemoProject { code: ProjectCode, name: string, notePattern: string, basis: string, criteria: string }

export const PROJECTS: DemoProject[] = [
  {
    code: 'QW-19', name: 'Ondrell', notePattern: 'QSN-19-{0000}',
    basis: 'CS-25 and 14 CFR part 25, paragraphs 303, 305, 613, 619 and 625',
    criteria: 'QW19-SC-002 issue 2: factor of safety 1.5; fitting factor 1.15 on ultimate and on limit (paragraph 5.3); nominal thickness unless a note says minimum (paragraph 4.2); imposed displacements are factored like loads. Demonstration data.',
  },
  {
    code: 'QL-8', name: 'Torvane', notePattern: 'QSN-40-{0000}',
    basis: 'EN 1915-2 and EN 1993-1-1',
    criteria: 'QL8-SC-001 issue 1: 1.5 on variable loads and 1.00 on yield, partial factors of EN 1993-1-1 (paragraph 4); grade minima (S basis) accepted (paragraph 3); roller rotation at most 2.4° (paragraph 7). Demonstration data.',
  },
]

export const PERSON_KEYS = ['ilse', 'tunde', 'noemie', 'meera', 'koji', 'catalina', 'padraig', 'lindiwe', 'yusuf'] as const
export type PersonKey = (typeof PERSON_KEYS)[number]

export interface DemoPerson {
  key: PersonKey
  name: string
  email: string
  auditor: boolean
  administrator: boolean
  roles: Partial<Record<ProjectCode, ProjectRole[]>>
  /** Shown beside the sign-in that the launcher prints. */
  duty: string
}

const both = (...roles: ProjectRole[]): DemoPerson['roles'] => ({ 'QW-19': roles, 'QL-8': roles })
const person = (key: PersonKey, name: string, mail: string, duty: string, roles: DemoPerson['roles'] = {}): DemoPerson =>
  ({ key, name, email: `${mail}@quellmark.example`, auditor: key === 'lindiwe', administrator: key === 'yusuf', roles, duty })

export const PEOPLE: DemoPerson[] = [
  person('yusuf', 'Yusuf Karatepeli', 'yusuf.karatepeli', 'administrator'),
  person('ilse', 'Ilse Tveråmo', 'ilse.tveramo', 'analyst', both('analyst')),
  person('tunde', 'Tunde Akinsola-Briggs', 'tunde.akinsola', 'analyst', both('analyst')),
  person('noemie', 'Noémie Castagnoux', 'noemie.castagnoux', 'analyst and checker', both('analyst', 'checker')),
  person('meera', 'Meera Ranganekar', 'meera.ranganekar', 'checker', both('checker')),
  person('koji', 'Koji Hatamori', 'koji.hatamori', 'checker', { 'QW-19': ['checker'] }),
  person('catalina', 'Catalina Ferreyrón', 'catalina.ferreyron', 'approver', both('approver')),
  person('padraig', 'Pádraig Mulgannon', 'padraig.mulgannon', 'approver', both('approver')),
  person('lindiwe', 'Lindiwe Mthabiso', 'lindiwe.mthabiso', 'auditor'),
]

/** What `npm start` prints: who may sign in, and as what. */
export const DEMO_SIGN_INS = PEOPLE.map(({ name, email, duty }) => ({ name, email, duty, password: DEMO_PASSWORD }))
