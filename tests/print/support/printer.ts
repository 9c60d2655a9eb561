import { execFileSync } from 'node:child_process'
import { mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { PDFDocument } from 'pdf-lib'
import type { Measured } from '@/drafting/drawing'
import { pictureOf, words } from './rendered'
import type { PagePicture, Word } from './rendered'

const dpi = 300

/** What comes out of a printer: pictures of the sheets, and where the words stand on them. */
export interface Printed {
  readonly pictures: readonly PagePicture[]
  readonly words: readonly (readonly Word[])[]
}

/**
 * Prints a document on an imagined printer that makes so many mm of 100, across and along the paper, from the corner where it
 * takes it in. Sheets that lie on their side are fed with their short side first, as printers do.
 */
export async function printedOn(pdf: Uint8Array, printer: Measured): Promise<Printed> {
  const document = await PDFDocument.load(pdf)
  const said = words(pdf)
  const sheets = document.getPages().map((page, index) => {
    const upright = page.getWidth() <= page.getHeight()
    const across = (upright ? printer.short : printer.long) / 100
    const down = (upright ? printer.long : printer.short) / 100
    const picture = picturedAt(pdf, index + 1, dpi * across, dpi * down)
    const paper = [page.getWidth(), page.getHeight()].map((points) => Math.round((points / 72) * dpi))
    return {
      picture: onPaper(picture, paper[0] ?? 0, paper[1] ?? 0),
      words: (said[index] ?? []).map((word) => ({ ...word, x: word.x * across, y: word.y * down })),
    }
  })
  return {
    pictures: sheets.map(({ picture }) => picture),
    words: sheets.map(({ words }) => words),
  }
}

function picturedAt(pdf: Uint8Array, page: number, across: number, down: number): PagePicture {
  const folder = mkdtempSync(path.join(tmpdir(), 'printed-'))
  const file = path.join(folder, 'pattern.pdf')
  writeFileSync(file, pdf)
  const only = ['-f', String(page), '-l', String(page)]
  const finely = ['-rx', String(across), '-ry', String(down), '-gray']
  execFileSync('pdftoppm', [...only, ...finely, file, path.join(folder, 'page')])
  const [name = ''] = readdirSync(folder).filter((each) => each.endsWith('.pgm'))
  const picture = pictureOf(readFileSync(path.join(folder, name)))
  rmSync(folder, { recursive: true })
  return { ...picture, perMm: dpi / 25.4 }
}

/** The picture on a paper that keeps its size: what a shrunken page leaves free stays white, what swells over is lost. */
function onPaper(picture: PagePicture, width: number, height: number): PagePicture {
  const dark = new Uint8Array(width * height)
  for (let y = 0; y < Math.min(height, picture.height); y += 1) {
    const row = picture.dark.subarray(y * picture.width, y * picture.width + Math.min(width, picture.width))
    dark.set(row, y * width)
  }
  return { ...picture, width, height, dark }
}
