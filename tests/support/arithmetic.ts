/** A sum as it stands on a step, worked out the way a student would, without the engine's own reader. */
export interface WorkedSum {
  readonly left: number
  readonly sign: '=' | '≈'
  readonly right: number
}

/** Digits, fractions and signs of one side into a plain expression: `1 1/2` is one number, `÷` a division. */
function workOut(side: string): number {
  const plain = side
    .replace(/(\d+) (\d+)\/(\d+)/g, '($1 + $2 / $3)')
    .replace(/(?<![\d)] )(\d+)\/(\d+)/g, '($1 / $2)')
    .replaceAll('÷', '/')
    .replaceAll('×', '*')
    .replaceAll('−', ' -')
    .replaceAll('°', '')
    .replace(/\b(sqrt|min|max)\(/g, 'Math.$1(')
  if (!/^(?:[\d\s.,+\-*/()]|Math\.(?:sqrt|min|max))+$/.test(plain)) throw new Error(`Not a sum: ${side}`)
  return Number(new Function(`return ${plain}`)())
}

/** Both sides of '35 ÷ 6 + 1 1/2 ≈ 7 3/8', in the unit that it is written in. */
export function evaluateArithmetic(text: string): WorkedSum {
  const [left, sign, right, ...rest] = text.split(/ ([=≈]) /)
  if (left === undefined || right === undefined || rest.length > 0) throw new Error(`Not one sum: ${text}`)
  return { left: workOut(left), sign: sign === '=' ? '=' : '≈', right: workOut(right) }
}
