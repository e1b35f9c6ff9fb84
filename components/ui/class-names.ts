/** Joins class names and leaves out what is not there: `classNames('a', isOpen && 'b')`. */
export function classNames(...names: (string | false | null | undefined)[]): string {
  return names.filter(Boolean).join(' ');
}
