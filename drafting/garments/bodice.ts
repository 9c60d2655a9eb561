import { garment } from '../pen/garment'
import { choice, length } from '../pen/design'
import { drawBodice, finishBodice, fitBodice } from '../parts/bodice'
import { bodiceAllowances, bodiceEaseDesign, dartDesign, upperBodiceDesign } from '../parts/bodice/design'
import { bodiceEstimates, bodiceFound, bodiceWaistRules, upperBodiceRules } from '../parts/bodice/rules'
import { sleeveDesign, sleeveRules } from '../parts/sleeves'

/** The fitted bodice with bust and waist darts; the bust dart opens where the style puts it. */
export const bodice = garment({
  id: 'bodice',
  name: 'Fitted bodice',
  needs: ['bust', 'waist'],
  estimates: bodiceEstimates,
  design: [
    ...dartDesign,
    ...upperBodiceDesign,
    ...bodiceEaseDesign,
    choice('sleeve', 'Sleeve', 'sleeve', ['none', 'plain', 'flared', 'bell', 'puff']),
    ...sleeveDesign,
    length('zipLength', 'Zip length', 'opening', { default: 350, min: 150, max: 500 }),
    ...bodiceAllowances,
  ],
  rules: [...upperBodiceRules, ...bodiceWaistRules, ...sleeveRules],
  found: bodiceFound,
  draft(pen) {
    const drawn = drawBodice(pen, { waist: 'bound', zip: 'own' })
    fitBodice(pen, drawn)
    finishBodice(pen, drawn)
  },
})
