import { garment } from '../pen/garment'
import { drawBodice, finishBodice, fitBodice } from '../parts/bodice'
import { bodiceAllowances, bodiceEaseDesign, dartDesign, upperBodiceDesign } from '../parts/bodice/design'
import { bodiceEstimates, bodiceFound, bodiceWaistRules, upperBodiceRules } from '../parts/bodice/rules'
import { collarDesign, collarRules } from '../parts/collars'
import { buttonRules, openingDesign } from '../parts/openings'
import { allSleeves, sleeveDesign, sleeveRules } from '../parts/sleeves'

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
    ...sleeveDesign('none', ...allSleeves),
    ...collarDesign,
    ...openingDesign(['zip', 'button band'], 350),
    ...bodiceAllowances,
  ],
  rules: [
    ...upperBodiceRules,
    ...bodiceWaistRules,
    ...sleeveRules(...allSleeves),
    ...collarRules,
    ...buttonRules,
  ],
  found: bodiceFound,
  draft(pen) {
    const drawn = drawBodice(pen, {
      waist: 'bound',
      zip: 'own',
      buttons: pen.chosen('backOpening') === 'button band',
    })
    fitBodice(pen, drawn)
    finishBodice(pen, drawn)
  },
})
