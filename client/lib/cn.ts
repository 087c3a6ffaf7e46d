/** Joins class names; what is false, null or undefined is left out. */
export function cn(...names: (string | false | null | undefined)[]): string {
  return names.filter(Boolean).join(' ');
}
