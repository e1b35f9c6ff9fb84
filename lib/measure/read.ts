/**
 * One thing read, as the engine takes it: a length in mm or an angle in degrees, with the standard
 * uncertainty of that reading and the id it carries in the wall book.
 */
export type Read = { id: string; value: number; u: number };
