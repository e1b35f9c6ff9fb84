import type { Figure } from './figure';

/** A length or an angle with its standard uncertainty and the readings it comes from. */
export type Measured = Pick<Figure, 'value' | 'u' | 'from'>;

/** A kilometre: past this a figure is no reading of a room, and squares of it would lose their digits. */
const PAST_ANY_ROOM = 1e6;

/** A number a room can have, and an uncertainty that is one. */
export function isMeasured({ value, u }: Measured): boolean {
  return isOfARoom(value) && u >= 0 && u <= PAST_ANY_ROOM;
}

export function isOfARoom(value: number): boolean {
  return Math.abs(value) <= PAST_ANY_ROOM;
}

/** Something there is: more than nothing. */
export function isSize(value: number): boolean {
  return value > 0 && isOfARoom(value);
}
