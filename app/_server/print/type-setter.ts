import 'server-only'
import type fontkit from '@pdf-lib/fontkit'
import type { PDFDocument, PDFFont } from 'pdf-lib'
import { typesetFractions } from '@/drafting/drawing'
import { faceOf, fontFiles } from './faces'
import type { FontFile, FontWeight } from './faces'

/** A run of glyphs from one face, or a narrow gap between two of them. */
export type Run =
  | {
      /** The name by which pages know the face: 'F0'… */
      readonly font: string
      /** Glyphs as a PDF hex string. */
      readonly glyphs: string
    }
  /** ems */
  | { readonly gap: number }

/** The narrow spaces, in ems. They are set as gaps: the faces hold them as empty glyphs, which the font library cannot measure. */
const narrowSpaces: Readonly<Record<string, number>> = {
  '\u2009': 0.16,
  '\u200a': 0.12,
  '\u200b': 0,
  '\ufeff': 0,
}

/** A text ready to be written. Widths are in ems. */
export interface SetText {
  readonly runs: readonly Run[]
  readonly width: number
}

/**
 * Sets texts in Source Sans 3 for one document: fractions as type, each character from the face that has it, and of every face
 * only the glyphs that are used.
 */
export class TypeSetter {
  readonly #embedded = new Map<string, { name: string; font: PDFFont }>()
  readonly #set = new Map<string, SetText>()

  private constructor(private readonly document: PDFDocument) {}

  /** @returns a setter with both weights of the latin face at hand; the others are embedded when a text asks for them. */
  static async for(document: PDFDocument, texts: Iterable<string>): Promise<TypeSetter> {
    const setter = new TypeSetter(document)
    const needed = new Set<FontFile>(['latin'])
    for (const text of texts) for (const run of faceRuns(text)) needed.add(run.file)
    for (const file of fontFiles.filter((file) => needed.has(file))) {
      await setter.#embed(file, 400)
      await setter.#embed(file, 600)
    }
    return setter
  }

  async #embed(file: FontFile, weight: FontWeight): Promise<void> {
    const { font, bytes } = faceOf(file, weight)
    const parsedAlready: Pick<typeof fontkit, 'create'> = { create: () => font }
    this.document.registerFontkit(parsedAlready)
    const embedded = await this.document.embedFont(bytes, { subset: true })
    this.#embedded.set(`${file} ${weight}`, { name: `F${this.#embedded.size}`, font: embedded })
  }

  /** Faces by the name that pages know them by. */
  fonts(): readonly { readonly name: string; readonly font: PDFFont }[] {
    return [...this.#embedded.values()]
  }

  /** A text set in one weight; the same text is set once. */
  set(text: string, weight: FontWeight): SetText {
    const key = `${weight} ${text}`
    const known = this.#set.get(key)
    if (known) return known
    const runs: Run[] = []
    let width = 0
    for (const { file, text: part } of faceRuns(typesetFractions(text))) {
      const gap = narrowSpaces[part]
      if (gap !== undefined) {
        runs.push({ gap })
        width += gap
        continue
      }
      const face = this.#embedded.get(`${file} ${weight}`) ?? this.#embedded.get(`latin ${weight}`)
      if (!face) continue
      runs.push({ font: face.name, glyphs: face.font.encodeText(part).toString() })
      width += face.font.widthOfTextAtSize(part, 1)
    }
    const set = { runs, width }
    this.#set.set(key, set)
    return set
  }

  /** Width of a text, mm, at an em of `size` mm. */
  width(text: string, size: number, weight: FontWeight = 400): number {
    return this.set(text, weight).width * size
  }

  /** A text cut off with an ellipsis where it would be wider than `width` mm. */
  shortened(text: string, size: number, width: number, weight: FontWeight = 400): string {
    if (this.width(text, size, weight) <= width) return text
    let shorter = text
    while (shorter && this.width(`${shorter}…`, size, weight) > width)
      shorter = shorter.slice(0, -1).trimEnd()
    return `${shorter}…`
  }

  /** Breaks a text into lines of at most `width` mm; a single longer word stands alone. */
  wrap(text: string, size: number, width: number, weight: FontWeight = 400): readonly string[] {
    const space = this.width(' ', size, weight)
    const lines: string[] = []
    let line = ''
    let reach = 0
    for (const word of text.split(' ')) {
      const wide = this.width(word, size, weight)
      if (line && reach + space + wide > width) {
        lines.push(line)
        line = word
        reach = wide
      } else {
        line = line ? `${line} ${word}` : word
        reach += wide + (reach > 0 ? space : 0)
      }
    }
    return line ? [...lines, line] : lines
  }
}

/** Which face has a character; what no face has goes with latin, whose replacement box then shows. */
function fileOf(character: string): FontFile {
  const code = character.codePointAt(0) ?? 0
  return fontFiles.find((file) => faceOf(file, 400).font.hasGlyphForCodePoint(code)) ?? 'latin'
}

function faceRuns(text: string): readonly { readonly file: FontFile; readonly text: string }[] {
  const runs: { file: FontFile; text: string }[] = []
  for (const character of text) {
    const file = fileOf(character)
    const last = runs.at(-1)
    const apart = character in narrowSpaces || (last && last.text in narrowSpaces)
    if (last && last.file === file && !apart) last.text += character
    else runs.push({ file, text: character })
  }
  return runs
}
