/** Dimensions on a drawing stand without their unit: the drawing names it once. */
export function bare(length: string): string {
  return length.replace(/ mm$|"$/, '').replace('-', '−');
}
