import type { Unit } from './state'

const eighths = ['', '⅛', '¼', '⅜', '½', '⅝', '¾', '⅞'] as const

/** mm → '4½ inches', '1 inch', '11.4 centimetres': what a screen reader says well. Nearest eighth or millimetre. */
export function lengthInWords(mm: number, unit: Unit): string {
  if (unit === 'cm') {
    const cm = Math.round(mm) / 10
    return `${cm} ${cm === 1 ? 'centimetre' : 'centimetres'}`
  }
  const count = Math.round((Math.abs(mm) * 8) / 25.4)
  const whole = Math.floor(count / 8)
  const part = eighths[count % 8] ?? ''
  const figure = `${mm < 0 && count > 0 ? '−' : ''}${whole > 0 || !part ? whole : ''}${part}`
  return `${figure} ${count > 0 && count <= 8 ? 'inch' : 'inches'}`
}
