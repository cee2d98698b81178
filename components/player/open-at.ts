/** The second that `?t=` asks for, may be a fraction; null when there is none or it is no place in a film. */
export function openAtOf(t: string | string[] | undefined): number | null {
  const asked = Array.isArray(t) ? t[0] : t
  if (!asked || !/^\d{1,6}(\.\d{1,3})?$/.test(asked)) return null
  return Number(asked)
}
