import { execFileSync } from 'node:child_process'
import { mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'

/** A page as a printer would lay it down: darkness of each dot, 0 white to 255 black. */
export interface PagePicture {
  readonly width: number
  readonly height: number
  readonly dark: Uint8Array
  /** Dots per millimetre. */
  readonly perMm: number
}

/** A word on a page with the middle of its box, mm from the top left corner. */
export interface Word {
  readonly text: string
  readonly x: number
  readonly y: number
}

const dpi = 300
const perMm = dpi / 25.4

function inFolder<T>(pdf: Uint8Array, work: (file: string, folder: string) => T): T {
  const folder = mkdtempSync(path.join(tmpdir(), 'pattern-'))
  const file = path.join(folder, 'pattern.pdf')
  writeFileSync(file, pdf)
  return work(file, folder)
}

/** Every page at 300 dpi. */
export function rendered(pdf: Uint8Array): readonly PagePicture[] {
  return inFolder(pdf, (file, folder) => {
    execFileSync('pdftoppm', ['-r', String(dpi), '-gray', file, path.join(folder, 'page')])
    const files = readdirSync(folder).filter((name) => name.endsWith('.pgm'))
    const pictures = files.sort().map((name) => pictureOf(readFileSync(path.join(folder, name))))
    rmSync(folder, { recursive: true })
    return pictures
  })
}

/** Reads a portable graymap: 'P5', width, height, 255, then a byte a dot from white (255) to black (0). */
export function pictureOf(bytes: Uint8Array): PagePicture {
  const header = /^P5\s+(\d+)\s+(\d+)\s+255\s/.exec(Buffer.from(bytes.subarray(0, 64)).toString('latin1'))
  if (!header) throw new Error('pdftoppm wrote something other than a graymap')
  const dark = bytes.subarray(header[0].length).map((light) => 255 - light)
  return { width: Number(header[1]), height: Number(header[2]), dark, perMm }
}

/** The words of every page with their places, as they can be selected and read aloud. */
export function words(pdf: Uint8Array): readonly (readonly Word[])[] {
  const html = inFolder(pdf, (file, folder) => {
    const text = execFileSync('pdftotext', ['-bbox', file, '-'], { encoding: 'utf8', maxBuffer: 1 << 26 })
    rmSync(folder, { recursive: true })
    return text
  })
  const mm = (points: number) => (points * 25.4) / 72
  return html
    .split('<page ')
    .slice(1)
    .map((page) =>
      [
        ...page.matchAll(
          /<word xMin="([\d.]+)" yMin="([\d.]+)" xMax="([\d.]+)" yMax="([\d.]+)">(.*?)<\/word>/g,
        ),
      ].map(([, left, top, right, bottom, text]): Word => ({
        text: text ?? '',
        x: mm((Number(left) + Number(right)) / 2),
        y: mm((Number(top) + Number(bottom)) / 2),
      })),
    )
}

/** The text of one page in reading order. */
export function pageText(pdf: Uint8Array, page: number): string {
  return inFolder(pdf, (file, folder) => {
    const text = execFileSync('pdftotext', ['-f', String(page), '-l', String(page), '-layout', file, '-'], {
      encoding: 'utf8',
    })
    rmSync(folder, { recursive: true })
    return text
  })
}

/** What qpdf finds wrong; it exits with an error when the file is damaged. */
export function checkedByQpdf(pdf: Uint8Array): string {
  return inFolder(pdf, (file, folder) => {
    const report = execFileSync('qpdf', ['--check', file], { encoding: 'utf8' })
    rmSync(folder, { recursive: true })
    return report
  })
}
