/** Exactly 25.4 mm to the inch (NIST SP 811, B.8); for rule tables that were published in inches. */
export function exactInches(inches: number): number {
  // 25.4 is not exact in binary: 254 · n / 10 keeps whole and dyadic inches exact to the last bit.
  return (inches * 254) / 10;
}
