/** What holds the ends of a tapered rod: nothing, or one of them. */
export type TaperedRodEnds = 'free' | 'large-fixed' | 'small-fixed'
