/** The one channel between the page and the desktop host. */
export const BRIDGE_CHANNEL = 'bridge'

/** Name under which the preload script hands the page its way to the host. */
export const BRIDGE_GLOBAL = 'barwright'
