/** What a text costs, in words. */

/**
 * Messages of the carrier, and their price where it is known.
 * Example: 2 at 0.008 USD are "2 messages, 0.016 USD"; 1 with no price known is "1 message"; none is
 * "empty".
 */
export function textCostWords(
  segments: number,
  price: { perSegment: number; currency: string } | null,
): string {
  if (segments === 0) return 'empty';
  const count = segments === 1 ? '1 message' : `${segments} messages`;
  if (!price) return count;
  const cost = Number((segments * price.perSegment).toPrecision(4));
  return `${count}, ${cost} ${price.currency}`;
}
