import { badRequest } from './errors'
import type { Found } from './rank'
import type { Doc, Index, Json } from './shapes'
import { textsOf, valueAt } from './words'

export type Order = (left: Doc, right: Doc) => number

const present = (value: Json | undefined) => value !== undefined && value !== null && value !== ''

/** Numbers before texts; whatever has no value comes last in both directions. */
function byField(path: string, descending: boolean): Order {
  return (left, right) => {
    const [a, b] = [valueAt(left, path), valueAt(right, path)]
    if (!present(a) || !present(b)) return Number(present(b)) - Number(present(a))
    const bothNumbers = typeof a === 'number' && typeof b === 'number'
    const [x = '', y = ''] = [textsOf(a)[0], textsOf(b)[0]]
    const order = bothNumbers ? a - b : x < y ? -1 : Number(x > y)
    return descending ? -order : order
  }
}

/** `["publishedAt:desc"]` as an order. Throws 400 for what is not sortable or not readable. */
export function sortOrder(index: Index, sort: string[]): Order {
  const orders = sort.map((each) => {
    const match = /^(.+):(asc|desc)$/.exec(each)
    const path = match?.[1]
    if (!path) throw badRequest(`\`${each}\` is not \`attribute:asc\` or \`attribute:desc\`.`, 'invalid_search_sort')
    if (!index.settings.sortableAttributes.includes(path)) {
      throw badRequest(`Attribute \`${path}\` is not sortable.`, 'invalid_search_sort')
    }
    return byField(path, match[2] === 'desc')
  })
  return (left, right) => orders.reduce((order, next) => order || next(left, right), 0)
}

/** Better first, rule by rule; a later rule decides only what the earlier ones leave even. */
export function byRules(
  documents: Map<number, Doc>,
  rules: string[],
  sort: Order,
): (left: Found, right: Found) => number {
  const document = ({ number }: Found): Doc => documents.get(number) ?? {}
  const orders = rules.map((rule) => {
    const custom = /^(.+):(asc|desc)$/.exec(rule)
    if (rule === 'sort') return (left: Found, right: Found) => sort(document(left), document(right))
    if (custom?.[1]) {
      const order = byField(custom[1], custom[2] === 'desc')
      return (left: Found, right: Found) => order(document(left), document(right))
    }
    return (left: Found, right: Found) => (right.steps[rule]?.at ?? 0) - (left.steps[rule]?.at ?? 0)
  })
  return (left, right) => orders.reduce((order, next) => order || next(left, right), 0) || left.number - right.number
}
