import type { PageResult } from '../../../src-main/contract/bridge'
import type { Result } from '../../../src-main/contract/result'
import { makeSolve } from '../../../src-main/engine/solveRig'
import { readRig } from '../../../src-main/engine/rig/readRig'
import { packResult } from '../../../src-main/workers/packResult'

/**
 * Solves a rig and packs its result as the page has it.
 *
 * @param rig - as it would stand in a file
 */
export function solvePage(rig: object): PageResult {
  const { rig: checked, faults } = readRig(JSON.stringify(rig))
  if (checked === null) throw new Error(JSON.stringify(faults))
  const solve = makeSolve(checked)
  solve.advance(solve.steps)
  const named = {
    format: 'barwright-result/1',
    rig: { title: checked.title, sha256: '' },
    notice: '',
  } as const
  return packResult({ ...solve.finish(), ...named } as Result).result
}

/** A striker on a shaft with a shoulder; E / rho gives c = 5135 m/s, so the striker's pulse lasts 117 us. */
export const STEPPED_RIG = {
  format: 'barwright-rig/1',
  title: 'Striker on a stepped shaft',
  materials: {
    steel: {
      density: '7850 kg/m^3',
      modulus: '207 GPa',
      poisson: 0.29,
      allowable: { tension: '700 MPa', compression: '900 MPa' },
    },
  },
  leftEnd: { kind: 'free' },
  bars: [
    {
      name: 'striker',
      material: 'steel',
      velocity: '12 m/s',
      sections: [{ length: '300 mm', diameter: '20 mm' }],
    },
    {
      name: 'shaft',
      material: 'steel',
      sections: [
        { length: '800 mm', diameter: '20 mm' },
        { length: '60 mm', diameter: { from: '20 mm', to: '30 mm' } },
        { length: '500 mm', diameter: '30 mm', bore: '10 mm' },
      ],
    },
  ],
  joints: [{ kind: 'contact' }],
  rightEnd: { kind: 'fixed' },
  gauges: [
    { name: 'G1', bar: 'shaft', at: '400 mm' },
    { name: 'G2', bar: 'shaft', at: '1110 mm' },
  ],
  margins: { factorOfSafety: 1.5 },
  run: { duration: '1 ms', cell: '2 mm' },
}
