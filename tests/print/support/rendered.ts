import { execFileSync } from 'node:child_process'
import { mkdtempSync, readdirSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'
import sharp from 'sharp'

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
export async function rendered(pdf: Uint8Array): Promise<readonly PagePicture[]> {
  const { folder } = inFolder(pdf, (file, folder) => {
    execFileSync('pdftoppm', ['-r', String(dpi), '-gray', '-png', file, path.join(folder, 'page')])
    return { folder }
  })
  const files = readdirSync(folder)
    .filter((name) => name.endsWith('.png'))
    .sort()
  const pictures: PagePicture[] = []
  for (const name of files) {
    const { data, info } = await sharp(path.join(folder, name))
      .grayscale()
      .raw()
      .toBuffer({ resolveWithObject: true })
    const dark = new Uint8Array(data.length)
    for (let index = 0; index < data.length; index += 1) dark[index] = 255 - (data[index] ?? 255)
    pictures.push({ width: info.width, height: info.height, dark, perMm })
  }
  rmSync(folder, { recursive: true })
  return pictures
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
