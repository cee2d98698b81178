import { notYetHeldAgainst, nrcs, sssa, termsOf } from '../term'

const standing = ['water', 'flood', 'flooded', 'levee', 'levees', 'paddy', 'terrace', 'drain', 'drained', 'draining']

export const waterTerms = termsOf('Water', [
  {
    slug: 'field-capacity',
    label: 'field capacity',
    definition: 'The water that a soil still holds once free drainage has all but stopped, a few days after a soaking.',
    synonyms: ['FC', 'drained upper limit'],
    spanish: 'capacidad de campo',
    sourceNote: sssa,
    explainer: 'ground-fit-to-work',
  },
  {
    slug: 'wilting-point',
    label: 'permanent wilting point',
    definition:
      'The water content at which a wilted plant does not come back overnight. What is left is out of its reach.',
    synonyms: ['wilting point', 'PWP'],
    spanish: 'punto de marchitez permanente',
    sourceNote: sssa,
  },
  {
    slug: 'available-water',
    label: 'available water',
    definition: 'The water between field capacity and the wilting point: what a crop can draw on.',
    synonyms: ['available water capacity', 'plant-available water', 'AWC'],
    spanish: 'agua disponible',
    sourceNote: nrcs,
    explainer: 'ground-fit-to-work',
  },
  {
    slug: 'infiltration',
    label: 'infiltration',
    definition: 'Water going in at the soil surface. What falls faster than that stands or runs off.',
    synonyms: ['intake rate'],
    inflections: ['infiltrate', 'infiltrates', 'infiltrated', 'infiltrating'],
    spanish: 'infiltración',
    sourceNote: sssa,
  },
  {
    slug: 'wetting-front',
    label: 'wetting front',
    definition: 'The line between soil that a rain has wetted and soil below that is still dry. A spade shows it.',
    synonyms: ['wet front'],
    spanish: 'frente de humedecimiento',
    sourceNote: sssa,
  },
  {
    slug: 'runoff',
    label: 'runoff',
    definition: 'Rain or irrigation that leaves over the surface instead of going in.',
    spanish: 'escorrentía',
    sourceNote: nrcs,
  },
  {
    slug: 'percolation',
    label: 'percolation',
    definition: 'Water moving down past the roots.',
    synonyms: ['deep percolation'],
    inflections: ['percolate', 'percolates', 'percolated'],
    context: { notNear: ['coffee'] },
    spanish: 'percolación',
    sourceNote: sssa,
  },
  {
    slug: 'evapotranspiration',
    label: 'evapotranspiration',
    definition: 'The water that goes up into the air from the soil and through the crop together.',
    synonyms: ['ET', 'crop water use'],
    spanish: 'evapotranspiración',
    sourceNote: notYetHeldAgainst('FAO Irrigation and Drainage Paper 56'),
  },
  {
    slug: 'irrigation',
    label: 'irrigation',
    definition: 'Water put on a crop on purpose.',
    inflections: ['irrigate', 'irrigates', 'irrigated', 'irrigating'],
    spanish: 'riego',
    agrovoc: 'c_3954',
    sourceNote: notYetHeldAgainst('FAO AGROVOC'),
  },
  {
    slug: 'levee',
    label: 'levee',
    definition: 'A low earth bank that keeps a flood on a field. On a slope it follows the contour.',
    regional: [
      { place: 'South Asia', name: 'bund' },
      { place: 'UK', name: 'field dyke' },
    ],
    spanish: 'bordo',
    sourceNote: nrcs,
  },
  {
    slug: 'check',
    label: 'check',
    definition: 'The levelled basin between two levees, flooded and drained as one.',
    regional: [
      { place: 'Arkansas', name: 'rice bay' },
      { place: 'Asia', name: 'paddy basin' },
    ],
    // "Check the gate" is not one: the noun comes after an article or what tells one basin from the next.
    context: {
      crops: ['rice'],
      near: [...standing, 'fill', 'gate', 'gates', 'board', 'boards', 'inches'],
      after:
        'a the this that each every one our upper lower top bottom next first second third last dry full rice'.split(
          ' ',
        ),
      notNear: ['valve', 'list', 'mark', 'bank', 'pay'],
    },
    sourceNote: nrcs,
  },
  {
    slug: 'gate',
    label: 'gate',
    definition: 'The opening in a levee whose boards set how high the water stands above it.',
    synonyms: ['levee gate', 'spill box', 'weir box'],
    context: {
      near: [...standing, 'check', 'checks', 'board', 'boards'],
      notNear: ['cattle', 'cow', 'cows', 'latch', 'road'],
    },
    sourceNote: nrcs,
  },
  {
    slug: 'tile',
    label: 'tile',
    definition: 'A buried pipe with holes that takes water away from under a field.',
    synonyms: ['drain tile', 'tile line', 'tile drain'],
    inflections: ['tiled'],
    regional: [{ place: 'UK', name: 'field drain' }],
    context: { notNear: ['roof', 'floor', 'bathroom', 'ceramic'] },
    sourceNote: nrcs,
  },
])
