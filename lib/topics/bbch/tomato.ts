import { series, type StageTable } from './series'

const ordinal = (n: number) => ['', 'first', '2nd', '3rd'][n] ?? `${n}th`

/** Meier 2001, solanaceous fruits, two-digit key. The three-digit variant (501 …) is not used. No 3x, no 4x. */
export const tomatoStages: StageTable = {
  '00': 'dry seed',
  '01': 'seed begins to take up water',
  '03': 'seed full of water',
  '05': 'root tip out of the seed',
  '07': 'hypocotyl with the seed leaves through the seed coat',
  '09': 'emergence, seed leaves through the surface',
  '10': 'seed leaves open',
  '11': 'first true leaf open',
  ...series(12, 18, (n) => `${n} true leaves open`),
  '19': '9 or more true leaves open',
  '21': 'first side shoot at the top (bush kinds)',
  ...series(22, 28, (n) => `${n} side shoots at the top (bush kinds)`),
  '29': '9 or more side shoots at the top (bush kinds)',
  ...series(51, 58, (n) => `${ordinal(n)} flower truss in sight`),
  '59': '9 or more flower trusses in sight',
  ...series(61, 68, (n) => `${ordinal(n)} truss, first flower open`),
  '69': '9 or more trusses with open flowers',
  ...series(71, 78, (n) => `${ordinal(n)} cluster, first fruit full size`),
  '79': '9 or more clusters with fruit full size',
  '81': '10 % of fruit in ripe colour',
  '85': '50 % of fruit in ripe colour',
  '89': 'fruit fully ripe',
  '97': 'plant dead',
  '99': 'harvested',
}
