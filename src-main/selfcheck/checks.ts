import type { Check } from './check'
import { COLLISION_CHECKS } from './checks/collisionChecks'
import { DISPERSION_CHECKS } from './checks/dispersionChecks'
import { FILLET_CHECKS } from './checks/filletChecks'
import { FINITE_STRAIN_CHECKS } from './checks/finiteStrainChecks'
import { LOAD_CHECKS } from './checks/loadChecks'
import { MASS_CHECKS } from './checks/massChecks'
import { PENETRATION_CHECKS } from './checks/penetrationChecks'
import { PLASTIC_CHECKS } from './checks/plasticChecks'
import { RELEASE_CHECKS } from './checks/releaseChecks'
import { ROD_SPEED_CHECKS } from './checks/rodSpeedChecks'
import { SPLIT_BAR_CHECKS } from './checks/splitBarChecks'
import { SPALL_CHECKS } from './checks/spallChecks'
import { STEP_CHECKS } from './checks/stepChecks'
import { TAPER_CHECKS } from './checks/taperChecks'
import { VIBRATION_CHECKS } from './checks/vibrationChecks'

/** The published checks, in the order of their topics. */
export const CHECKS: readonly Check[] = [
  ...STEP_CHECKS,
  ...COLLISION_CHECKS,
  ...MASS_CHECKS,
  ...LOAD_CHECKS,
  ...VIBRATION_CHECKS,
  ...TAPER_CHECKS,
  ...DISPERSION_CHECKS,
  ...SPLIT_BAR_CHECKS,
  ...SPALL_CHECKS,
  ...PENETRATION_CHECKS,
  ...FILLET_CHECKS,
  ...RELEASE_CHECKS,
  ...ROD_SPEED_CHECKS,
  ...PLASTIC_CHECKS,
  ...FINITE_STRAIN_CHECKS,
]
