import type { RuleDefinition } from '../contract'
import { lengthRule } from '../pen/garment'

/** Depths and openings of the necklines that every bodice draws alike. Common practice, no published source. */
export const neckRules: readonly RuleDefinition[] = [
  lengthRule('scoopNeckDepth', 'Scoop neck: front depth', 'frontNeckDepth + 4cm'),
  lengthRule('scoopWidening', 'Scoop neck: opening along the shoulder', 'neckWidening + 1.5cm'),
  lengthRule('sweetheartNeckDepth', 'Sweetheart neck: front depth', 'frontNeckDepth + 8cm'),
  lengthRule('sweetheartWidening', 'Sweetheart neck: opening along the shoulder', 'neckWidening + 1.5cm'),
]
