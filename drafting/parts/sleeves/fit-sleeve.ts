import { endOf, intersections, pathLength, startOf } from '../../geometry'
import { fitAcross, type Pen } from '../../pen/pen'
import { straight, type PiecePen } from '../../pen/piece-pen'

/** A sleeve against the arm: round it at the underarm, its hem, and its length down the grain. */
export function fitSleeve(pen: Pen, sleeve: PiecePen, crown: string): void {
  const hem = sleeve.edge('hem').path
  lengthFit(pen, sleeve, crown)
  const across = straight(
    endOf(sleeve.edge('underarm-back').path),
    startOf(sleeve.edge('underarm-front').path),
  )
  pen.fit(
    fitAcross('biceps', 'at-least', pen.value('sleeveEase'), pen.value('upperArm'), [
      { piece: 'sleeve', path: across, times: 1, length: pathLength(across) },
    ]),
  )
  pen.fit(
    fitAcross('sleeve-hem', 'shown', 0, undefined, [
      { piece: 'sleeve', path: hem, times: 1, length: pathLength(hem) },
    ]),
  )
}

/** The sleeve against the arm: from the crown straight down to the hem. */
function lengthFit(pen: Pen, sleeve: PiecePen, top: string): void {
  const crown = sleeve.at(top)
  const deep = { x: crown.x, y: sleeve.at('hemLevel').y + 200 }
  const foot =
    intersections(sleeve.edge('hem').path, straight(crown, deep))[0]?.point ?? sleeve.at('hemLevel')
  const path = straight(crown, { x: crown.x, y: foot.y })
  pen.fit(
    fitAcross('sleeve-length', 'shown', 0, pen.value('armLength'), [
      { piece: 'sleeve', path, times: 1, length: pathLength(path) },
    ]),
  )
  const over = pathLength(path) - pen.value('armLength')
  if (over > 30) {
    pen.caution(
      'sleeve-long',
      `The sleeve is ${pen.say(over)} longer than the arm. Shorten it, or let it gather at the wrist.`,
      'sleeveLength',
      'armLength',
    )
  }
}
