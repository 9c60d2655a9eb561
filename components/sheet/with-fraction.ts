/** '7 3/8' with '1/2' → '7 1/2'; '7' with '0' → '7'; '3/8' with '1/2' → '1/2'. The whole inches stay. */
export function withFraction(text: string, part: string): string {
  const whole = /^\s*(\d+)(?![\d/]*\/)/.exec(text)?.[1] ?? ''
  if (part === '0') return whole || '0'
  return whole && whole !== '0' ? `${whole} ${part}` : part
}
