import type { SourceEntry } from '../entries'

type Written = Pick<SourceEntry, 'key' | 'title'> &
  Partial<Pick<SourceEntry, 'authors' | 'publisher' | 'year' | 'url'>> & {
    type: string
    more?: Record<string, unknown>
  }

const name = (author: string) => {
  const [family = author, given] = author.split(', ')
  return given ? { family, given } : { literal: author }
}

/** CSL-JSON from the same fields that the page shows, so that the two cannot differ. */
function source({
  type,
  more = {},
  authors = [],
  publisher = null,
  year = null,
  url = null,
  ...rest
}: Written): SourceEntry {
  const csl = {
    id: rest.key,
    type,
    title: rest.title,
    ...(authors.length > 0 && { author: authors.map(name) }),
    ...(publisher && { publisher }),
    ...(year && { issued: { 'date-parts': [[year]] } }),
    ...(url && { URL: url }),
    ...more,
  }
  return { ...rest, authors, publisher, year, url, csl }
}

/**
 * Publications that the explainers lean on. Titles as printed there, or told by the page's address where only the text
 * was seen; a year that is not given is left out.
 */
export const sources: SourceEntry[] = [
  source({
    key: 'nrcs-feel-mt',
    type: 'webpage',
    title: 'Estimating Soil Moisture by Feel and Appearance',
    authors: ['USDA Natural Resources Conservation Service, Montana'],
    publisher: 'USDA NRCS',
    url: 'http://www.nrcs.usda.gov/wps/portal/nrcs/detail/mt/newsroom/factsheets/?cid=nrcs144p2_056492',
  }),
  source({
    key: 'nrcs-feel-wy',
    type: 'webpage',
    title: 'Appearance of Sandy Clay Loam, Loam, and Silt Loam Soils',
    authors: ['USDA Natural Resources Conservation Service, Wyoming'],
    publisher: 'USDA NRCS',
    url: 'https://www.nrcs.usda.gov/wps/portal/nrcs/detail/wy/soils/?cid=nrcs142p2_026831',
  }),
  source({
    key: 'osu-soil-health',
    type: 'webpage',
    title: 'Soil health pages: compaction',
    authors: ['The Ohio State University'],
    publisher: 'The Ohio State University',
    url: 'https://soilhealth.osu.edu/node/106',
  }),
  source({
    key: 'psu-traffic',
    type: 'webpage',
    title: 'Quick and Easy Worksheet for Assessing Traffic-Induced Soil Compaction Risk',
    authors: ['Penn State Extension'],
    publisher: 'Penn State Extension',
    url: 'https://extension.psu.edu/quick-and-easy-worksheet-for-assessing-traffic-induced-soil-compaction-risk',
  }),
  source({
    key: 'dexter-bird-2001',
    type: 'article-journal',
    title:
      'Methods for predicting the optimum and the range of soil water contents for tillage based on the water retention curve',
    authors: ['Dexter, A. R.', 'Bird, N. R. A.'],
    year: 2001,
    more: { 'container-title': 'Soil and Tillage Research', volume: '57', page: '203-212' },
  }),
  source({
    key: 'astm-d4318',
    type: 'standard',
    title: 'Standard Test Methods for Liquid Limit, Plastic Limit, and Plasticity Index of Soils (D4318)',
    authors: ['ASTM International'],
    publisher: 'ASTM International',
  }),
  source({
    key: 'psu-wheat-stand',
    type: 'webpage',
    title: 'Wheat Stand Assessment',
    authors: ['Penn State Extension'],
    publisher: 'Penn State Extension',
    url: 'https://extension.psu.edu/wheat-stand-assessment',
  }),
  source({
    key: 'umn-winter-wheat-stand',
    type: 'webpage',
    title: 'Winter Wheat Stand Evaluation',
    authors: ['University of Minnesota Extension'],
    publisher: 'University of Minnesota Extension',
    year: 2011,
    url: 'http://blog.lib.umn.edu/efans/cropnews/2011/05/winter-wheat-stand-evaluation.html',
  }),
  source({
    key: 'growwinterwheat-spring',
    type: 'webpage',
    title: 'Spring Stand Assessment',
    authors: ['Grow Winter Wheat'],
    url: 'https://www.growwinterwheat.ca/growing-winter-wheat/planning/general-planning/spring-stand-assessment/',
  }),
  source({
    key: 'seeding-by-kernel-weight',
    type: 'webpage',
    title: 'Are you seeding for optimal yield?',
    authors: ['Potter, Bob'],
    publisher: '360 Ag Consulting',
    year: 2015,
    url: 'http://360agconsulting.com/author/bob_potter',
  }),
  source({
    key: 'purdue-heat-units',
    type: 'webpage',
    title: 'Heat Unit Concepts Related to Corn Development',
    authors: ['Nielsen, R. L.'],
    publisher: 'Purdue University',
    url: 'https://extension.entm.purdue.edu/newsletters/pestandcrop/article/heat-unit-concepts-related-to-corn-development',
  }),
  source({
    key: 'purdue-leaf-stage',
    type: 'webpage',
    title: 'Predict Leaf Stage Development in Corn Using Thermal Time',
    authors: ['Nielsen, R. L.'],
    publisher: 'Purdue University',
    year: 2019,
    url: 'https://www.agry.purdue.edu/Ext/corn/news/timeless/vstageprediction.html',
  }),
  source({
    key: 'osu-corn-2018-15',
    type: 'webpage',
    title: 'C.O.R.N. Newsletter 2018-15: staging corn with severe leaf damage early in the season',
    authors: ['The Ohio State University'],
    publisher: 'The Ohio State University',
    year: 2018,
    url: 'https://agcrops.osu.edu/newsletter/corn-newsletter/2018-15/staging-corn-severe-leaf-damage-early-season',
  }),
  source({
    key: 'waushara-gdd-2018',
    type: 'article-newspaper',
    title: 'Calculating growing degree days',
    publisher: 'Waushara Argus',
    year: 2018,
    url: 'https://www.wausharaargus.com/latest-ag-news/calculating-growing-degree-days',
  }),
  source({
    key: 'mcmaster-wilhelm-1997',
    type: 'article-journal',
    title: 'Growing degree-days: one equation, two interpretations',
    authors: ['McMaster, G. S.', 'Wilhelm, W. W.'],
    year: 1997,
    more: {
      'container-title': 'Agricultural and Forest Meteorology',
      volume: '87',
      page: '291-300',
      DOI: '10.1016/S0168-1923(97)00027-0',
    },
  }),
  source({
    key: 'ksu-wheat-development',
    type: 'webpage',
    title: 'Development',
    authors: ['Kansas State University'],
    publisher: 'myFields',
    url: 'https://www.myfields.info/book/development',
  }),
  source({
    key: 'sdsu-shrink-2019',
    type: 'article-newspaper',
    title: 'David Karki column: corn grain moisture shrinkage',
    authors: ['Karki, David'],
    publisher: 'Watertown Public Opinion',
    year: 2019,
    url: 'https://www.thepublicopinion.com/news/farming/david-karki-column-corn-grain-moisture-shrinkage/article_69222e43-5b40-5812-b562-2b67fba26df2.html',
  }),
  source({
    key: 'nch-61',
    type: 'report',
    title: 'Calculating Grain Weight Shrinkage in Corn Due to Mechanical Drying (National Corn Handbook, NCH-61)',
    authors: ['Hicks, D. R.', 'Cloud, H. A.'],
    publisher: 'University of Minnesota',
    url: 'https://studylib.net/doc/8350056/calculating-grain-weight-shrinkage-in-corn-due-to-mechani...',
  }),
  source({
    key: 'sdsu-understanding-shrink-2014',
    type: 'webpage',
    title: 'Understanding Corn Shrink',
    authors: ['Dillivan, Kim'],
    publisher: 'SDSU Extension',
    year: 2014,
    url: 'http://www.farms.com/Commentaries/understanding-corn-shrink-83012.aspx',
  }),
]
