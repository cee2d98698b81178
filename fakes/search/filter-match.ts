import { badRequest } from './errors'
import { readFilter, type Condition } from './filter'
import type { Doc, Index, Json } from './shapes'
import { folded, textsOf, valueAt } from './words'

const numberOf = (text: string) => (text.trim() === '' ? NaN : Number(text))

function equals(texts: string[], value: string): boolean {
  const wanted = folded(value)
  const number = numberOf(value)
  return texts.some((text) => folded(text) === wanted || (!Number.isNaN(number) && numberOf(text) === number))
}

/** Numbers compare as numbers, anything else as text. */
function compares(text: string, op: '>' | '>=' | '<' | '<=', value: string): boolean {
  const [left, right] = [numberOf(text), numberOf(value)]
  const order = Number.isNaN(left) || Number.isNaN(right) ? (text < value ? -1 : Number(text > value)) : left - right
  if (op === '>') return order > 0
  if (op === '>=') return order >= 0
  return op === '<' ? order < 0 : order <= 0
}

const isEmpty = (value: Json | undefined) =>
  value === '' || (typeof value === 'object' && value !== null && Object.keys(value).length === 0)

type Comparison = Exclude<Condition, { of: Condition[] }>

function answers(value: Json | undefined, condition: Comparison): boolean {
  const texts = textsOf(value)
  switch (condition.op) {
    case 'exists':
      return value !== undefined
    case 'null':
      return value === null
    case 'empty':
      return isEmpty(value)
    case 'in':
      return condition.values.some((each) => equals(texts, each))
    case 'to':
      return texts.some((text) => compares(text, '>=', condition.from) && compares(text, '<=', condition.to))
    case '=':
      return equals(texts, condition.value)
    // Documented: what has no such field is not equal to anything, and is found by !=.
    case '!=':
      return !equals(texts, condition.value)
    default: {
      const { op } = condition
      return texts.some((text) => compares(text, op, condition.value))
    }
  }
}

function holds(document: Doc, condition: Condition): boolean {
  if (!('of' in condition)) return answers(valueAt(document, condition.attribute), condition)
  if (condition.op === 'or') return condition.of.some((each) => holds(document, each))
  const all = condition.of.every((each) => holds(document, each))
  return condition.op === 'not' ? !all : all
}

function attributesOf(condition: Condition): string[] {
  return 'of' in condition ? condition.of.flatMap(attributesOf) : [condition.attribute]
}

/** `*` in a name stands for any run of characters. */
export function covers(names: string[], attribute: string): boolean {
  return names.some((name) => {
    const parts = name.split('*')
    if (parts.length === 1) return name === attribute || attribute.startsWith(`${name}.`)
    const [head = '', tail = ''] = [parts[0], parts.at(-1)]
    return attribute.startsWith(head) && attribute.endsWith(tail)
  })
}

function conditionsOf(filter: unknown): Condition {
  if (typeof filter === 'string') return readFilter(filter)
  if (!Array.isArray(filter)) throw badRequest('A filter is a text or a list.', 'invalid_search_filter')
  const of = filter.map((part: unknown): Condition => {
    if (!Array.isArray(part)) return conditionsOf(part)
    return { op: 'or', of: part.map((each: unknown) => conditionsOf(each)) }
  })
  return { op: 'and', of }
}

/** The test that a filter stands for: a text, or a list of conditions that all hold, whose inner lists are choices. */
export function filterTest(index: Index, filter: unknown): (document: Doc) => boolean {
  if (filter === undefined || filter === null || filter === '') return () => true
  const condition = conditionsOf(filter)
  const unknown = attributesOf(condition).find((name) => !covers(index.settings.filterableAttributes, name))
  if (unknown !== undefined) {
    const known = index.settings.filterableAttributes.join(', ') || 'none'
    throw badRequest(`Attribute \`${unknown}\` is not filterable. Filterable: ${known}.`, 'invalid_search_filter')
  }
  return (document) => holds(document, condition)
}
