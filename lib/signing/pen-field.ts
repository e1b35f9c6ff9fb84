/** The field that is signed in, as it is kept whatever the glass; from the upper left. */
export const PEN_FIELD = { width: 600, height: 260 };

export const MOST_STROKES = 200;
export const MOST_POINTS = 12_000;
