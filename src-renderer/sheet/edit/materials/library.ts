import type { MaterialDocument } from '../../../stores/document/rigDocument'

/** Where the typical values come from. */
const CALLISTER = 'Callister, Fundamentals of Materials Science and Engineering, 3rd ed., tables B.2 and B.4'
const DOWLING = 'Dowling, Mechanical Behavior of Materials, table 5.2'
const LIST = 'a published density list'
const ALUMINIUM = 'Aluminum Association typical values'
const MEMORY = 'from memory'
const WARNING =
  'Typical at room temperature, not certified: check your certificate, and give your own allowables.'

/** A material of the library, without allowables: those are the user's to give. */
export interface LibraryMaterial {
  name: string
  material: MaterialDocument
}

function typical(
  name: string,
  density: number,
  modulus: number,
  poisson: number,
  yieldStress: number | null,
  source: string,
): LibraryMaterial {
  return {
    name,
    material: {
      density: `${density} kg/m^3`,
      modulus: `${modulus} GPa`,
      poisson,
      ...(yieldStress === null ? {} : { yield: `${yieldStress} MPa` }),
      source: `${source} ${WARNING}`,
    },
  }
}

/** Typical values of common bar materials, each number with its source. */
export const MATERIAL_LIBRARY: readonly LibraryMaterial[] = [
  typical(
    'steel 4340, oil quenched, tempered 315 °C',
    7850,
    207,
    0.29,
    1620,
    `Modulus and yield: ${CALLISTER}. Density: ${LIST}. Poisson's ratio: ${MEMORY}.`,
  ),
  typical(
    'steel A36',
    7850,
    200,
    0.29,
    250,
    `Density, modulus and yield: an open textbook's table of material properties. Poisson's ratio: ${MEMORY}, 0.26 to 0.32 elsewhere.`,
  ),
  typical(
    'stainless steel 304, annealed',
    7860,
    193,
    0.27,
    207,
    `Modulus: ${CALLISTER}. Density, Poisson's ratio and yield: an open textbook's table of material properties.`,
  ),
  typical('maraging steel 18Ni(350)', 8080, 200, 0.3, 2300, `All values: ${MEMORY}.`),
  typical('aluminium 6061-T6', 2700, 68.9, 0.33, 276, `${ALUMINIUM}.`),
  typical(
    'aluminium 7075-T6',
    2810,
    71,
    0.33,
    505,
    `Modulus and yield: ${CALLISTER}. Density: ${LIST}. Poisson's ratio: ${MEMORY}.`,
  ),
  typical(
    'aluminium 2024-T3',
    2780,
    72.4,
    0.33,
    345,
    `Modulus and yield: ${CALLISTER}. Density: ${LIST}. Poisson's ratio: ${MEMORY}.`,
  ),
  typical(
    'titanium Ti-6Al-4V, annealed',
    4430,
    114,
    0.33,
    830,
    `A published data sheet; yield also ${CALLISTER}.`,
  ),
  typical(
    'copper C11000, H04',
    8890,
    115,
    0.34,
    310,
    `Modulus and yield: ${CALLISTER}. Poisson's ratio: ${DOWLING}. Density: ${LIST}.`,
  ),
  typical(
    'brass C26000, H04',
    8530,
    110,
    0.35,
    435,
    `Modulus and yield: ${MEMORY}. Poisson's ratio: ${DOWLING}. Density: ${LIST}.`,
  ),
  typical(
    'magnesium AZ31B, rolled',
    1770,
    45,
    0.29,
    220,
    `Yield: ${CALLISTER}. Poisson's ratio: ${DOWLING}. Density: ${LIST}. Modulus: ${MEMORY}.`,
  ),
  typical(
    'tungsten',
    19300,
    411,
    0.28,
    760,
    `Modulus and Poisson's ratio: ${DOWLING}. Yield: ${CALLISTER}. Density: ${MEMORY}.`,
  ),
  typical(
    'nickel alloy 625, annealed',
    8440,
    207,
    0.31,
    517,
    `Yield: ${CALLISTER}. Density, modulus and Poisson's ratio: ${MEMORY}.`,
  ),
  typical(
    'lead, chemical',
    11340,
    13.5,
    0.44,
    null,
    `Modulus: ${CALLISTER}. Poisson's ratio: ${DOWLING}. Density: ${MEMORY}. Yield 6 to 8 MPa: ${CALLISTER}.`,
  ),
  typical(
    'acrylic (PMMA)',
    1190,
    2.7,
    0.35,
    null,
    `Modulus and Poisson's ratio: ${DOWLING}. Density: ${MEMORY}. Yield 53.8 to 73.1 MPa: ${CALLISTER}.`,
  ),
  typical(
    'polycarbonate',
    1200,
    2.38,
    0.38,
    62,
    `Modulus: ${CALLISTER}. Poisson's ratio: ${DOWLING}. Density and yield: ${MEMORY}.`,
  ),
  typical(
    'nylon 6,6, dry',
    1140,
    2.7,
    0.41,
    80,
    `Modulus and Poisson's ratio: ${DOWLING}. Density and yield: ${MEMORY}.`,
  ),
]
