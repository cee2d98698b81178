/** Joins class names and drops what is absent. */
export const classNames = (...names: (string | false | null | undefined)[]) => names.filter(Boolean).join(' ')
