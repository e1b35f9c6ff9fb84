/** The shape in which a figure is explained, and what is said of several. */
export type FigureWords = {
  /** "Blank of a filler". */
  name: string;
  /** The formula, as one would say it at the bench. */
  formula: string;
  /** What would make U smaller. */
  surer: string;
  measure: 'length' | 'angle' | 'slope';
  /** Which way it is rounded when it is shown: blanks and gaps to cover up, openings down. */
  rounding: 'up' | 'down' | 'nearest';
};

/** What makes several figures surer. */
export const readAgain =
  'Reading it again with the same tool helps a little; with a better tool, more.';
export const moreHeights = 'Reading the length at three heights, and the corners on longer legs.';
export const faceRow =
  'A row of face readings on the end wall, so that its bow need not be assumed.';
