/** The phone's own day: the shop's, unless the phone is set to another part of the world. */
export function localToday(now = new Date()): string {
  const two = (part: number) => String(part).padStart(2, '0');
  return `${now.getFullYear()}-${two(now.getMonth() + 1)}-${two(now.getDate())}`;
}
