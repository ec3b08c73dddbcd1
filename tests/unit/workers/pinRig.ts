/** A small rig for tests of what carries rigs: a weight dropped on a stepped pin, made up for them. */
export const PIN_RIG = {
  format: 'barwright-rig/1',
  title: 'Weight on a pin',
  materials: {
    steel: {
      density: '7850 kg/m^3',
      modulus: '207 GPa',
      allowable: { tension: '600 MPa', compression: '800 MPa' },
    },
  },
  leftEnd: { kind: 'mass', mass: '2 kg', velocity: '3 m/s' },
  bars: [
    {
      name: 'pin',
      material: 'steel',
      sections: [
        { length: '240 mm', diameter: '24 mm' },
        { length: '160 mm', diameter: '18 mm' },
      ],
    },
  ],
  rightEnd: { kind: 'fixed' },
  run: { duration: '0.8 ms', cell: '2 mm' },
}
