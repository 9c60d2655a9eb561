import 'server-only'
import type { Draft } from '@/drafting/contract'
import type { ChalkGuide, ChalkSheet } from '@/drafting/chalk/guide'
import type { ChalkMark, Laying } from '@/drafting/chalk/layings'
import type { Style } from '@/drafting/drawing'
import type { Block } from './blocks'
import { foldPicture } from './chalk-fold'
import { piecePicture } from './chalk-picture'
import type { TypeSetter } from './type-setter'

const box: Style = { stroke: 'ink', width: 0.25 }
/** Read at arm's length: 14 points and more for what is measured, 12 for what explains it. */
const large = 5.2
const plain = 4.3
const small = 3.7
const leading = 1.32

/**
 * The guide as blocks for a column of a width, mm. A fold state begins a page: on its left how the cloth lies and the piece looks, on
 * its right what is done.
 */
export function chalkBlocks(
  guide: ChalkGuide,
  draft: Draft,
  type: TypeSetter,
  width: number,
): readonly Block[] {
  const set = new Setting(type, width)
  return [
    ...guide.sheets.flatMap((sheet) => sheetBlocks(sheet, draft, set)),
    { ...set.heading('Walk the seams', 9), starts: 'page' },
    set.paragraph('Before you cut, measure these lines on the cloth. What is sewn together must agree.'),
    ...guide.checks.flatMap(({ name, words, agrees }) => [
      set.line(name, agrees ? words : `${words}: look again, they do not agree`),
    ]),
    { ...set.heading('For every piece', 6), starts: 'column' },
    ...guide.rules.map((words) => set.lines([[words, plain, false]])),
    set.heading('Take care', 6),
    set.paragraph(
      'Shears, rotary cutters and irons hurt: keep them from children and off the edge of the table. Cut a toile in cheap cloth before dear cloth.',
    ),
  ]
}

function sheetBlocks(sheet: ChalkSheet, draft: Draft, set: Setting): readonly Block[] {
  const piece = draft.pieces.find(({ id }) => id === sheet.id)
  if (!piece) return []
  return [
    { ...set.heading(sheet.name, 9), starts: 'page' },
    foldPicture(sheet.fold, piece),
    ...sheet.fold.words.map((words) => set.lines([[words, plain, false]])),
    piecePicture(piece, sheet, set.width),
    { ...set.heading('Mark with the tape', 6), starts: 'column' },
    ...sheet.layings.flatMap((laying) => set.laying(laying)),
    set.heading('Join the marks', 6),
    ...sheet.curves.map(({ words, straight, off }) =>
      set.lines([
        [words, small, false],
        [straight, plain, true],
        ...(off ? [[off, plain, true] as const] : []),
      ]),
    ),
    set.heading('Allowances and notches', 6),
    ...[...sheet.allowances, ...sheet.notches].map((words) => set.lines([[words, plain, false]])),
    ...sheet.cutting.flatMap((words) => [set.heading('Cut', 6), set.lines([[words, plain, false]])]),
  ]
}

/** Words, their size in mm, and whether they are what is measured. */
type Text = readonly [words: string, size: number, strong: boolean]

/** Sets words in the column. */
class Setting {
  constructor(
    private readonly type: TypeSetter,
    readonly width: number,
  ) {}

  heading(words: string, size: number): Block {
    return {
      height: size * 1.9,
      keeps: true,
      draw: (content, at) => content.text(words, { x: at.x, y: at.y + size * 1.3 }, { size, weight: 600 }),
    }
  }

  paragraph(words: string): Block {
    return this.lines([[words, plain, false]], 0)
  }

  /** Lines one below the other, with a box before the first to be ticked. */
  lines(texts: readonly Text[], indent = 8): Block {
    const wrapped = texts.flatMap(([words, size, strong]) => {
      const weight = strong ? 600 : 400
      return this.type
        .wrap(words, size, this.width - indent, weight)
        .map((text) => ({ text, size, weight }) as const)
    })
    const height = wrapped.reduce((sum, { size }) => sum + size * leading, 0) + 2.5
    return {
      height,
      draw: (content, at) => {
        if (indent > 0) content.boxes([{ x: at.x, y: at.y + 0.6 }], 4, 4, box)
        let y = at.y
        for (const { text, size, weight } of wrapped) {
          y += size * leading
          content.text(text, { x: at.x + indent, y: y - size * 0.35 }, { size, weight })
        }
      },
    }
  }

  /** A name and what is measured, on one line where there is room. */
  line(name: string, words: string): Block {
    return this.lines([
      [name, plain, false],
      [words, plain, true],
    ])
  }

  /** Where the tape is laid, then each mark that is read off it. */
  laying({ words, tape, marks }: Laying): readonly Block[] {
    const lone = !tape
    const rows = marks.map((mark, index) => this.mark(mark, lone && index === 0 ? words : ''))
    if (lone) return rows
    const head: Block = {
      height: large * 1.5,
      keeps: true,
      draw: (content, at) =>
        content.text(words, { x: at.x, y: at.y + large * 1.1 }, { size: large, weight: 600, dye: 'indigo' }),
    }
    return [head, ...rows]
  }

  private mark(mark: ChalkMark, before: string): Block {
    const indent = 19
    const said = [before, mark.distance].filter(Boolean).join(' ')
    const head = this.type.wrap(said, large, this.width - indent, 600)
    const words = this.type.wrap(mark.words, small, this.width - indent)
    const height = head.length * large * leading + words.length * small * leading + 1.6
    return {
      height,
      draw: (content, at) => {
        content.boxes([{ x: at.x, y: at.y + 1.8 }], 4, 4, box)
        content.text(mark.letter, { x: at.x + 8, y: at.y + large * 1.15 }, { size: 6.4, weight: 600 })
        let y = at.y
        for (const line of head) {
          y += large * leading
          content.text(line, { x: at.x + indent, y: y - large * 0.2 }, { size: large, weight: 600 })
        }
        for (const line of words) {
          y += small * leading
          content.text(line, { x: at.x + indent, y: y - small * 0.3 }, { size: small, dye: 'walnut' })
        }
      },
    }
  }
}
