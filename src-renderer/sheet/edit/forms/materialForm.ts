import { joinPath } from '../../../stores/document/joinPath'
import { parsePath } from '../../../stores/document/parsePath'
import type { RigDocument } from '../../../stores/document/rigDocument'
import { writeAt } from '../../../stores/document/writeAt'
import { findFreeName } from '../changeBars'
import { plainChoices, value, type PartForm } from './fieldSpec'

/**
 * Lists the fields of a material.
 *
 * @param document - the rig
 * @param path - of the material
 * @returns its fields and what can be done with it
 */
export function makeMaterialForm(document: RigDocument, path: string): PartForm {
  const name = String(parsePath(path)[1])
  const uses = countUses(document, name)
  const own = findFreeName(Object.keys(document.materials ?? {}), name)
  return {
    rows: [
      [
        {
          path,
          label: 'Name',
          kind: 'words',
          shown: name,
          width: 120,
          set: (rig, next) => renameMaterial(rig, name, String(next)),
        },
        value(`${path}.density`, 'Density'),
        value(`${path}.modulus`, 'Modulus', undefined, 76),
        { path: `${path}.poisson`, label: 'Poisson ν', kind: 'number', empty: 'unknown', width: 64 },
        value(`${path}.allowable.tension`, 'Tension allowable', 'none'),
        value(`${path}.allowable.compression`, 'Compression allowable', 'none', 116),
        value(`${path}.yield`, 'Yield', 'elastic', 76),
      ],
      [
        value(`${path}.hardening`, 'Tangent after yield', 'none'),
        {
          path: `${path}.hardeningRule`,
          label: 'Hardening',
          kind: 'choice',
          choices: [{ value: '', text: 'isotropic' }, ...plainChoices(['kinematic'])],
          empty: 'isotropic',
          width: 84,
        },
        value(`${path}.viscosity`, 'Viscosity', 'none', 76),
        value(`${path}.spall`, 'Spall stress', 'none', 76),
        value(`${path}.fatigue.strength`, 'Fatigue strength', 'none'),
        { path: `${path}.fatigue.exponent`, label: 'Exponent', kind: 'number', empty: 'none', width: 60 },
      ],
    ],
    beside: [
      {
        path: `${path}.source`,
        label: 'Source',
        kind: 'words',
        empty: 'not said',
        width: 400,
      },
    ],
    actions: [
      {
        word: 'Add a copy',
        label: `Copy material ${name}`,
        change: (rig) => ({ ...rig, materials: { ...rig.materials, [own]: { ...rig.materials?.[name] } } }),
        select: joinPath('materials', own),
      },
      {
        word: 'Remove',
        label: `Remove material ${name}`,
        change: (rig) => writeAt(rig, path, undefined),
        select: 'materials',
        not: uses === 0 ? undefined : `${uses} ${uses === 1 ? 'part is' : 'parts are'} made of it`,
      },
    ],
  }
}

function countUses({ bars = [] }: RigDocument, name: string): number {
  return bars.reduce(
    (sum, { material, sections = [] }) =>
      sum + Number(material === name) + sections.filter((section) => section.material === name).length,
    0,
  )
}

/** A new name keeps the material's place, and goes to whatever is made of it. */
function renameMaterial(document: RigDocument, before: string, name: string): RigDocument {
  const { materials = {}, bars = [] } = document
  if (name !== before && Object.hasOwn(materials, name)) return document
  const follow = <T extends { material?: string }>(part: T): T =>
    part.material === before ? { ...part, material: name } : part
  return {
    ...document,
    materials: Object.fromEntries(
      Object.entries(materials).map(([key, one]) => [key === before ? name : key, one]),
    ),
    bars: bars.map((bar) => ({
      ...follow(bar),
      ...(bar.sections ? { sections: bar.sections.map(follow) } : {}),
    })),
  }
}
