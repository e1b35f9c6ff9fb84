/** Branded numbers: a millimetre is not a degree, and the compiler knows. */

/** A length in millimetres. */
export type Mm = number & { readonly __unit?: 'mm' };
/** An angle in degrees. */
export type Deg = number & { readonly __unit?: 'deg' };
/** A dimensionless slope, millimetres per millimetre. */
export type Slope = number & { readonly __unit?: 'mm/mm' };
/** A span of working time in minutes. */
export type Minutes = number & { readonly __unit?: 'min' };

export const mm = (value: number): Mm => value as Mm;
export const deg = (value: number): Deg => value as Deg;

/** How a person reads and writes lengths: inches with fractions, or millimetres. */
export type LengthUnit = 'in' | 'mm';
