import { it } from 'vitest'
import { marchRig, marchElements } from '../unit/engine/march'
import { makeBar, makePulse, makeRig, makeSection } from '../unit/engine/testRig'
import { marchElementsAtCourant } from './elementsAtCourant'
const C=5000,AREA=1e-3,Z=4e7*AREA,T=1e-4,LENGTH=C*T,SHORT=.875*LENGTH
it('x',()=>{
 for (const cells of [40,160]) {
  const rig = makeRig(
        [makeBar('bar', [makeSection(SHORT, AREA), makeSection(LENGTH, 1.5 * AREA)])],
        {duration: 8*T, timeStep: T/cells},
        {
          leftEnd: { kind: 'displacement', pulse: makePulse((t) => 1e-5 * (t < T ? Math.sin((Math.PI * t) / (2 * T)) ** 4 : 1)) },
          rightEnd: { kind: 'penetration', loading: (5 * Z) / T, unloading: (15 * Z) / T },
        },
      )
  const w=marchRig(rig), e=marchElementsAtCourant(rig,.8), e1=marchElements(rig)
  for (const r of [w,e1,e]) console.log(cells, Array.from({length:33},(_,i)=>{const k=Math.round(i*T/4/r.line.dt); return (r.record.node(2)!.forceLeft[Math.min(k,r.line.steps)]).toFixed(0)}).join(' '))
 }
})
