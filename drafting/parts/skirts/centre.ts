import type { DesignValue, RuleDefinition } from '../../contract'
import { choice, length } from '../../pen/design'
import { lengthRule } from '../../pen/garment'
import type { Pen } from '../../pen/pen'
import type { SkirtHalf } from './marks'
import type { SkirtUse } from './skirt'

const walking = { id: 'walkingRoom', is: ['vent', 'slit'] }

/** Style values of the centre back below the zip. */
export const walkingDesign: readonly DesignValue[] = [
  choice('walkingRoom', 'Walking room at the centre back', 'hem', ['vent', 'slit', 'none'], {
    id: 'opening',
    is: ['centre-back zip'],
  }),
  length('ventHeight', 'Height of vent or slit', 'hem', { default: 180, min: 80, max: 350 }, walking),
  length(
    'ventWidth',
    'Width of the vent',
    'hem',
    { default: 40, min: 25, max: 60 },
    { id: 'walkingRoom', is: ['vent'] },
  ),
]

export const walkingRules: readonly RuleDefinition[] = [
  lengthRule(
    'ventDrawn',
    'Height of vent or slit, below zip and hip',
    'min(ventHeight, length - zipLength - centreBackDrop - 4cm, length - hipLine - 3cm)',
  ),
  lengthRule('ventSlope', 'Slope of the top of the vent', 'ventWidth * 0.5'),
]

type Half = Pick<SkirtHalf, 'piece' | 'side'>

const openAtBack = (half: Half, use: SkirtUse): boolean =>
  half.side === 'back' && use.opening === 'centre-back zip'

const ofVent = 'Change the height or the width of the vent instead.'

/** What opens below the zip so that one can walk. */
export type WalkingRoom = 'vent' | 'slit' | 'none'

/** Marks of zip, vent and slit on a centre back; none on a fold. */
export function skirtCentreMarks(pen: Pen, half: Half, use: SkirtUse, way: WalkingRoom): void {
  if (!openAtBack(half, use)) return
  const { piece } = half
  piece.go('zipEnd', 'centreWaist', 'down', use.zip, {
    say: 'Mark the end of the zip',
    drag: [use.zip],
    fixed: 'Change the length of the zip instead.',
  })
  if (way === 'none') return
  const short = pen.value('ventHeight') - pen.value('ventDrawn')
  if (short > 0.01) {
    pen.caution(
      'vent-shortened',
      `The ${way} is made ${pen.say(short)} lower than asked, to stay clear of zip and hip.`,
      'ventHeight',
      'length',
    )
  }
  piece.go('ventTop', 'centreHem', 'up', 'ventDrawn', {
    say: `From the hem go up the height of the ${way}`,
    round: 'down',
    drag: ['ventHeight'],
    fixed: ofVent,
  })
  pen.tag({
    piece: piece.id,
    from: 'centreHem',
    to: 'ventTop',
    label: `Height of the ${way}`,
    value: 'ventHeight',
  })
  if (way === 'slit') return
  piece.go('ventHem', 'centreHem', 'left', 'ventWidth', {
    say: 'Go out the width of the vent',
    drag: ['ventWidth'],
    fixed: ofVent,
  })
  piece.go('ventOut', 'ventTop', 'left', 'ventWidth', { say: 'Go out as far at its top', fixed: ofVent })
  piece.go('ventCorner', 'ventOut', 'down', 'ventSlope', { say: 'Slope the top down', fixed: ofVent })
}

/** Draws the centre from the hem up to the waist: a fold, or seam and opening with their vent or slit. */
export function drawSkirtCentre(pen: Pen, half: Half, use: SkirtUse, way: WalkingRoom): void {
  const { piece } = half
  if (half.side === 'back' && use.opening === 'open centre back') {
    piece.line('opening', 'centreHem', 'centreWaist', {
      role: 'opening',
      allowance: 'centreBackAllowance',
      corner: 'turned',
      say: 'The centre back, open from waist to hem',
    })
    return
  }
  if (!openAtBack(half, use)) {
    piece.line('centre', 'centreHem', 'centreWaist', { role: 'fold', say: 'The centre lies on the fold' })
    return
  }
  const allowance = 'centreBackAllowance'
  let from = 'centreHem'
  if (way === 'vent') {
    piece.line('vent', 'ventHem', 'ventCorner', {
      role: 'opening',
      allowance,
      corner: 'turned',
      say: 'The edge of the vent, turned in',
    })
    piece.line('vent-top', 'ventCorner', 'ventTop', {
      role: 'free',
      finish: 'turned',
      allowance,
      say: 'Its top, stitched down to the skirt',
    })
    from = 'ventTop'
  }
  if (way === 'slit') {
    piece.line('slit', 'centreHem', 'ventTop', {
      role: 'opening',
      allowance,
      corner: 'turned',
      say: 'The slit, turned in',
    })
    from = 'ventTop'
  }
  piece.line('centre', from, 'zipEnd', {
    role: 'seam',
    allowance,
    ...(way === 'none' ? { corner: 'turned' as const } : {}),
    say: 'The centre back seam below the zip',
  })
  piece.line('opening', 'zipEnd', 'centreWaist', {
    role: 'opening',
    allowance,
    say: 'The opening for the zip',
  })
  pen.sew({
    id: `${use.prefix}centre-back`,
    name: use.prefix ? 'Centre back of the skirt' : 'Centre back',
    a: [{ piece: piece.id, edge: 'centre' }],
    b: [{ piece: piece.id, edge: 'centre', mirrored: true }],
  })
}
