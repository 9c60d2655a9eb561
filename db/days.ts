/** How far a time zone's clock is ahead of UTC at an instant, in milliseconds. */
function zoneOffset(instant: number, timeZone: string): number {
  const parts = new Intl.DateTimeFormat('en-US', {
    timeZone,
    hourCycle: 'h23',
    year: 'numeric',
    month: 'numeric',
    day: 'numeric',
    hour: 'numeric',
    minute: 'numeric',
    second: 'numeric',
  }).formatToParts(instant)
  const part = (type: string) => Number(parts.find((each) => each.type === type)?.value)
  const clock = Date.UTC(
    part('year'),
    part('month') - 1,
    part('day'),
    part('hour'),
    part('minute'),
    part('second'),
  )
  return clock - Math.floor(instant / 1000) * 1000
}

/**
 * The instant at which a day ends in a time zone.
 * @param day YYYY-MM-DD
 */
export function endOfDay(day: string, timeZone: string): Date {
  const midnight = new Date(`${day}T00:00:00Z`).getTime() + 24 * 3600 * 1000
  const guess = midnight - zoneOffset(midnight, timeZone)
  return new Date(midnight - zoneOffset(guess, timeZone))
}
