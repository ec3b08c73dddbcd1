/** The sheet's typeface, as a canvas takes it. */
export const FONT = '"IBM Plex Sans Condensed", sans-serif'
