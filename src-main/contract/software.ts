import { version } from '../../package.json'

/** The program's name and version, as every result, report and window states them. */
export const SOFTWARE = { name: 'Barwright', version } as const
