import { layers } from './layers.mjs'

const within = (layer) => `^${layer.folder}/`

/** dependency-cruiser's rules: no file in a circle, no layer that reaches where the table does not let it. */
export default {
  forbidden: [
    { name: 'no-circle', severity: 'error', from: {}, to: { circular: true } },
    {
      name: 'no-file-outside-the-table',
      severity: 'error',
      from: { path: '^src-(main|renderer)/', pathNot: layers.map(within) },
      to: {},
    },
    { name: 'nothing-unresolved', severity: 'error', from: {}, to: { couldNotResolve: true } },
  ],
  options: {
    tsConfig: { fileName: 'tsconfig.base.json' },
    tsPreCompilationDeps: true,
    doNotFollow: { path: 'node_modules' },
    exclude: { path: '\\.css$' },
    enhancedResolveOptions: { exportsFields: ['exports'], conditionNames: ['import', 'node', 'types'] },
  },
}
