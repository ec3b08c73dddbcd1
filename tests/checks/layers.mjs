/**
 * The one table of layers: lint, the cycle check and the diagram in DEVELOPERS.md are made from it.
 *
 * `may` names the layers whose files a layer may import, besides its own. Data flows from the first
 * layer to the last; imports run the other way.
 */
const engine = (...names) => names.map((name) => `engine/${name}`)
const rooms = engine(
  'rig',
  'line',
  'laws',
  'march',
  'characteristics',
  'elements',
  'records',
  'answers',
  'exact',
)

export const layers = [
  { name: 'contract', folder: 'src-main/contract', what: 'types and texts that cross a boundary', may: [] },
  { name: 'engine/rig', what: 'text to a checked rig in SI', may: ['contract'] },
  { name: 'engine/line', what: 'rig to cells: impedance, travel time, grid', may: ['contract'] },
  { name: 'engine/laws', what: 'what closes the equations at a point', may: ['contract', ...engine('line')] },
  {
    name: 'engine/march',
    what: 'the time loop, and what a method shows of itself',
    may: ['contract', ...engine('line', 'laws')],
  },
  {
    name: 'engine/characteristics',
    what: 'the first method: waves along delay lines',
    may: ['contract', ...engine('line', 'laws', 'march')],
  },
  {
    name: 'engine/elements',
    what: 'the second method: central difference',
    may: ['contract', ...engine('line', 'laws', 'march')],
  },
  {
    name: 'engine/records',
    what: 'envelope, gauges, field, ledgers',
    may: ['contract', ...engine('line', 'laws', 'march')],
  },
  {
    name: 'engine/answers',
    what: 'ratios, fronts, margins, cautions',
    may: ['contract', ...engine('line', 'laws', 'records')],
  },
  { name: 'engine/exact', what: 'closed forms for checks', may: ['contract'] },
  { name: 'engine', what: 'a run from rig to result', may: ['contract', ...rooms] },
  { name: 'planning', what: 'what a rig still needs', may: ['contract', 'engine', ...rooms] },
  { name: 'studies', what: 'many runs', may: ['contract', 'engine', ...rooms] },
  { name: 'selfcheck', what: 'the published checks', may: ['contract', 'engine', ...rooms] },
  {
    name: 'documents',
    what: 'rig files, results, CSV, report',
    may: ['contract', 'engine', ...engine('rig')],
  },
  {
    name: 'workers',
    what: 'jobs off the main thread',
    may: ['contract', 'engine', ...engine('rig'), 'planning', 'studies', 'selfcheck', 'documents'],
  },
  {
    name: 'service',
    what: 'what stands behind the bridge',
    may: ['contract', 'engine', ...engine('rig'), 'planning', 'studies', 'workers', 'documents'],
  },
  { name: 'hosts/browser', what: "the machine's browser", may: ['contract', 'service'] },
  { name: 'hosts/desktop', what: 'Electron', may: ['contract', 'documents', 'service'] },
  {
    name: 'hosts/command-line',
    what: 'the terminal; `serve` starts the browser host',
    may: [
      'contract',
      'engine',
      ...engine('rig'),
      'planning',
      'studies',
      'selfcheck',
      'workers',
      'documents',
      'service',
      'hosts/browser',
    ],
  },
  { name: 'page', folder: 'src-renderer', what: 'the window', may: ['contract'] },
].map((layer) => ({ folder: `src-main/${layer.name}`, ...layer }))

/** Layers that run anywhere: no Node, no page, no clock, no chance, no locale. */
export const pureLayers = layers.filter(({ name }) =>
  /^(contract|engine|planning|studies|selfcheck)(\/|$)/.test(name),
)
