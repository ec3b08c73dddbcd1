import type { Bridge } from '../contract/bridge'
import { NOTICE } from '../contract/notice'
import { SOFTWARE } from '../contract/software'
import { solveText } from './solveText'

/**
 * Makes what stands behind the bridge of every host.
 *
 * @returns the bridge's methods, carried out in this process
 */
export function makeService(): Bridge {
  return {
    about: async () => ({ ...SOFTWARE, notice: NOTICE }),
    solve: async (text) => {
      const outcome = await solveText(text)
      switch (outcome.status) {
        case 'broken':
          throw new Error(`the numbers stopped being finite after step ${outcome.step} of ${outcome.steps}`)
        case 'stopped':
          throw new Error('the solve was stopped')
        default:
          return outcome
      }
    },
  }
}
