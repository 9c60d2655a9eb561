import 'server-only'
import { readFileSync } from 'node:fs'
import path from 'node:path'
import fontkit from '@pdf-lib/fontkit'
import { unwrapWoff } from './unwrap-woff'

export type FontWeight = 400 | 600
export type FontFile = 'latin' | 'latin-ext' | 'vietnamese'
type Font = ReturnType<typeof fontkit.create>

/** The faces of Source Sans 3 that a pattern may need, first the one that most characters come from. */
export const fontFiles: readonly FontFile[] = ['latin', 'latin-ext', 'vietnamese']

/** Written out, so that the build can see which files the server reads. */
const folder = path.join(process.cwd(), 'node_modules', '@fontsource', 'source-sans-3', 'files')

/** Texts whose glyphs are remembered in each face; the words of a pattern are nearly always the same. */
const rememberedTexts = 4000

export interface Face {
  readonly bytes: Uint8Array
  readonly font: Font
}

const faces = new Map<string, Face>()

/** A face, read and parsed once for all documents: parsing takes longer than drawing a page. */
export function faceOf(file: FontFile, weight: FontWeight): Face {
  const key = `${file}-${weight}`
  const known = faces.get(key)
  if (known) return known
  const bytes = unwrapWoff(readFileSync(path.join(folder, `source-sans-3-${key}-normal.woff`)))
  const face = { bytes, font: remembering(fontkit.create(bytes)) }
  faces.set(key, face)
  return face
}

/** The same font, which lays out a text only the first time it meets it. */
function remembering(font: Font): Font {
  const layouts = new Map<string, ReturnType<Font['layout']>>()
  const layout = font.layout.bind(font)
  font.layout = (text, features) => {
    if (features) return layout(text, features)
    const known = layouts.get(text)
    if (known) return known
    const fresh = layout(text)
    if (layouts.size < rememberedTexts) layouts.set(text, fresh)
    return fresh
  }
  return font
}
