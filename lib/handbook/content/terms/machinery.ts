import { asabe, notYetHeldAgainst, termsOf } from '../term'

export const machineryTerms = termsOf('Machinery and shop', [
  {
    slug: 'pto',
    label: 'PTO',
    definition:
      'The turning shaft by which a tractor drives an implement. It takes clothing and an arm before a hand can let go.',
    synonyms: ['power take-off', 'PTO shaft', 'power takeoff'],
    spanish: 'toma de fuerza',
    sourceNote: asabe('S203 and ISO 500'),
  },
  {
    slug: 'three-point-hitch',
    label: 'three-point hitch',
    definition: 'Two lower arms and a link above them that carry and lift an implement behind a tractor.',
    synonyms: ['3-point hitch', 'three point'],
    regional: [{ place: 'UK', name: 'three-point linkage' }],
    spanish: 'enganche de tres puntos',
    sourceNote: asabe('S217 and ISO 730'),
  },
  {
    slug: 'drawbar',
    label: 'drawbar',
    definition: 'The bar that pulled tools are pinned to; also the power that reaches it.',
    spanish: 'barra de tiro',
    sourceNote: asabe('S482'),
  },
  {
    slug: 'wheel-slip',
    label: 'wheel slip',
    definition: 'The share of a driven wheel’s travel that does not move the tractor.',
    synonyms: ['wheelslip'],
    spanish: 'patinaje',
    sourceNote: asabe('D497'),
  },
  {
    slug: 'ballast',
    label: 'ballast',
    definition: 'Weight added to a tractor for grip or balance.',
    inflections: ['ballasted', 'ballasting'],
    spanish: 'lastre',
    sourceNote: notYetHeldAgainst('the ASABE standards'),
  },
  {
    slug: 'rops',
    label: 'ROPS',
    definition: 'The frame that keeps a space for the driver when a tractor rolls. It works only with the belt on.',
    synonyms: ['roll-over protective structure', 'roll bar'],
    sourceNote: asabe('S519'),
  },
])
