import type { RigDocument } from './rigDocument'

/**
 * Makes what New begins with: a striker on a bar, small, valid, with a margin of its own.
 *
 * @returns a new document
 */
export function makeStartRig(): RigDocument {
  return {
    format: 'barwright-rig/1',
    title: 'New rig',
    materials: {
      steel: {
        density: '7850 kg/m^3',
        modulus: '200 GPa',
        poisson: 0.29,
        allowable: { tension: '400 MPa', compression: '400 MPa' },
        source: 'Typical of steel, from memory. The allowables are a beginning: put in your own.',
      },
    },
    leftEnd: { kind: 'free' },
    bars: [
      {
        name: 'striker',
        material: 'steel',
        velocity: '5 m/s',
        sections: [{ length: '200 mm', diameter: '20 mm' }],
      },
      { name: 'bar', material: 'steel', sections: [{ length: '800 mm', diameter: '20 mm' }] },
    ],
    joints: [{ kind: 'contact', gap: '0 mm' }],
    rightEnd: { kind: 'free' },
    gauges: [{ name: 'G1', bar: 'bar', at: '400 mm' }],
    margins: { factorOfSafety: 1.5 },
    run: { duration: '0.6 ms', cell: '2 mm' },
  }
}
