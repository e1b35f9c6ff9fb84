/** Said of a length that cannot be taken from corner to corner: the plan then asks for its pieces. */
export const IN_THE_WAY = 'Something stands in the way';
