import { nothing } from '../../pen/masks'
import type { Pen } from '../../pen/pen'
import { onFold, type OpenHalf, type Opening } from './opening'

/** A seam at the centre back with a zip in its upper part; the front on the fold. */
export const centreBackZip: Opening = {
  draw: (pen, front, back) => {
    onFold(front)
    zipInto(pen, back)
    return { front: { kind: 'fold' }, back: { kind: 'zip' } }
  },
}

function zipInto(pen: Pen, { piece: back, foot }: OpenHalf): void {
  const asked = pen.length('zipLength')
  const room = back.at(foot).y - back.at('centreNeck').y - 60
  const zip = pen.tape ? Math.min(asked, Math.floor(room / pen.tape) * pen.tape) : Math.min(asked, room)
  const level = back.mark(foot).y | back.mark('centreNeck').y
  pen.find('zipDrawn', zip, pen.usesOf(['zipLength']) | (zip < asked ? level : nothing))
  if (zip < asked) {
    pen.caution(
      'zip-shortened',
      `A zip that long would run into the hem, so the opening is drawn ${pen.say(zip)} long.`,
      'zipLength',
      'length',
    )
  }
  back.go('zipEnd', 'centreNeck', 'down', 'zipDrawn', {
    say: 'Down the centre back mark the end of the zip',
    drag: ['zipLength'],
  })
  pen.tag({
    piece: back.id,
    from: 'centreNeck',
    to: 'zipEnd',
    label: 'Zip',
    ...(zip < asked ? {} : { value: 'zipLength' }),
  })
  back.line('centre', foot, 'zipEnd', {
    role: 'seam',
    allowance: 'centreBackAllowance',
    corner: 'turned',
    say: 'The centre back seam, from the hem to the zip',
  })
  back.line('opening', 'zipEnd', 'centreNeck', {
    role: 'opening',
    allowance: 'centreBackAllowance',
    say: 'The opening for the zip',
  })
  back.notch('zip-end', 'opening', 0, 2)
  pen.sew({
    id: 'centre-back',
    name: 'Centre back',
    a: [{ piece: back.id, edge: 'centre' }],
    b: [{ piece: back.id, edge: 'centre', mirrored: true }],
    smooth: true,
  })
  pen.notion({ kind: 'zip', length: zip, count: 1 })
}
