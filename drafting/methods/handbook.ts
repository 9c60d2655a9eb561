import type { DraftingMethod, MethodRule } from '../contract'
import { commonPractice } from '../pen/garment'

/** Where a constant was read. Formulas were read there; the measurements they are worked with are always the client's own. */
const sources = {
  state: 'home-science bodice block of an Indian state syllabus, as reproduced on a public page',
  ingalls: 'Ingalls, Text-book on Domestic Art (1911), French lining draft',
  sloper: 'proportional bodice sloper in centimetres, as read on a public page',
  skirt: 'WikiEducator, open handout for drafting a skirt block',
  bennett: 'Bennett, The Perfect Dressmaking System (1914), p. 13',
} as const

const rule = (id: string, formula: string, source: string): MethodRule => ({ id, formula, source })

/** A neck that is deeper in front is drawn narrower, so that the whole still lies close. */
const narrower = `${commonPractice}: narrower by what the deeper front adds`

const dress: readonly MethodRule[] = [
  rule('armholeDepth', 'bust / 8 + 2 1/2 in', sources.state),
  rule('halfShoulder', 'acrossShoulders / 2 + 1/4 in', sources.state),
  rule('frontNeckDepth', 'neckBase / 5 + 1/4 in + frontNeckDrop', sources.ingalls),
  rule('neckWidth', 'neckBase / 5 - 0.6cm', narrower),
]

const bodice: readonly MethodRule[] = [
  rule(
    'scyeLine',
    'min(bust / 6 + 7cm, bust / 8 + 10.7cm)',
    `${sources.sloper}: bust / 6 + 7 cm; the other on a full bust, where that grows too fast: ${commonPractice}`,
  ),
  rule('backQuarter', '(bust + bustEase) / 4', `${sources.sloper}: front and back alike`),
  rule('frontQuarter', '(bust + bustEase) / 4', `${sources.sloper}: front and back alike`),
  rule('backWaistHalf', '(waist + waistEase) / 4', `${commonPractice}: as the quarters above it`),
  rule('frontWaistHalf', '(waist + waistEase) / 4', `${commonPractice}: as the quarters above it`),
  rule('frontNeckDepth', 'neckBase / 5 + 1/4 in + frontNeckDrop', sources.ingalls),
  rule('frontNeckWidth', 'neckBase / 5 - 0.85cm', narrower),
]

const skirt: readonly MethodRule[] = [
  rule('sideRise', 'min(1cm, quarterSuppression * 0.3)', `${sources.skirt}: 1 cm`),
  rule(
    'frontDartLong',
    'min(10cm, waistToHip * 0.5)',
    `${sources.skirt}: 10 cm; ${commonPractice} on a short hip`,
  ),
  rule(
    'backDartLong',
    'min(12cm, waistToHip * 0.6)',
    `${sources.skirt}: 12 cm; ${commonPractice} on a short hip`,
  ),
]

const gores: readonly MethodRule[] = [
  rule('goreWaist', 'waistEdge / gores', sources.bennett),
  rule('goreHip', 'max((hip + hipEase) / gores, goreWaist)', `${sources.bennett}, the ease added`),
]

/** Constants that stand in books and handouts which were read, where one of them differs from the trade's working rule. */
export const handbook: DraftingMethod = {
  id: 'handbook',
  name: 'Handbook',
  description:
    'Constants that stand in old manuals and open teaching pages, each with the page it was read on. Armholes are shallower on a full bust than freehand ones, necks deeper in front and narrower.',
  garments: {
    'flared-dress': dress,
    bodice,
    'straight-skirt': skirt,
    'a-line-skirt': skirt,
    'gored-skirt': gores,
  },
}
