/** The safety notice that the window, every report and the command line carry. */
export const NOTICE =
  'One-dimensional theory. Results are an aid to a qualified person; applicable codes and ' +
  'licensed practice decide. Guarding, ejected parts, stored gas and spring energy, and hearing ' +
  'protection are the site\'s.'
