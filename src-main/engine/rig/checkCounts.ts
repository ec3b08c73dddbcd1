import type { FaultList } from './faultList'
import { faultText } from './faultText'
import type { Loose } from './form/loose'
import type { RigForm } from './form/rigForm'
import { LIMITS } from './limits'
import type { Place } from './place'

/**
 * Checks how many there are of each part, before any work is done for them.
 * @param form of the rig
 * @param faults gets `too-large`
 * @returns true where there are not too many
 */
export function checkCounts(form: Loose<RigForm>, faults: FaultList): boolean {
  const sections = form.bars?.reduce((sum, bar) => sum + (bar?.sections?.length ?? 0), 0) ?? 0
  const counts: [
    Place,
    'variables' | 'materials' | 'bars' | 'sections' | 'gauges' | 'loads' | 'studies',
    number,
  ][] = [
    [['variables'], 'variables', Object.keys(form.variables ?? {}).length],
    [['materials'], 'materials', Object.keys(form.materials ?? {}).length],
    [['bars'], 'bars', form.bars?.length ?? 0],
    [['bars'], 'sections', sections],
    [['loads'], 'loads', form.loads?.length ?? 0],
    [['gauges'], 'gauges', form.gauges?.length ?? 0],
    [['studies'], 'studies', form.studies?.length ?? 0],
  ]
  const over = counts.filter(([, what, count]) => count > LIMITS[what])
  for (const [place, what, count] of over) faults.add(place, faultText.tooMany(what, LIMITS[what], count))
  return over.length === 0
}
