/** A rig without faults that uses the common parts: the start of most tests of the reader. */
export const EXAMPLE_RIG = {
  format: 'barwright-rig/1',
  title: 'Drop striker on a stepped shaft',
  notes: '',
  variables: { drop: '1.5 m' },
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
      velocity: 'sqrt(2 * gravity * drop)',
      sections: [{ length: '300 mm', diameter: '20 mm' }],
    },
    {
      name: 'shaft',
      material: 'steel',
      sections: [
        { length: '800 mm', diameter: '20 mm', fillet: '2 mm' },
        { length: '60 mm', diameter: { from: '20 mm', to: '30 mm' } },
        { length: '500 mm', diameter: '30 mm', bore: '10 mm' },
      ],
    },
  ],
  joints: [{ kind: 'contact', gap: '0 mm' }],
  rightEnd: { kind: 'fixed' },
  gauges: [{ name: 'G1', bar: 'shaft', at: '400 mm' }],
  margins: { factorOfSafety: 1.5 },
  run: { duration: '1.2 ms', cell: '2 mm', method: 'characteristics' },
}
