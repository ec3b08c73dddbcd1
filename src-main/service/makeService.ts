import type { Bridge } from '../contract/bridge'
import { NOTICE } from '../contract/notice'
import { SOFTWARE } from '../contract/software'

/**
 * Makes what stands behind the bridge of every host.
 *
 * @returns the bridge's methods, carried out in this process
 */
export function makeService(): Bridge {
  return {
    about: async () => ({ ...SOFTWARE, notice: NOTICE }),
    solve: async () => ({
      status: 'refused',
      faults: [
        {
          code: 'not-computed-yet',
          path: '',
          message: 'The window does not solve rigs yet; use `barwright solve` on the command line.',
        },
      ],
    }),
  }
}
