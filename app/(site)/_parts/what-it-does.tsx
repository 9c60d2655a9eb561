const parts = [
  {
    name: 'Measure',
    words:
      'A card for each fitting, in the order of the body, as you say it: 36 1/2, 92,7 cm, 3 ft. What is odd against the rest is pointed out, with the reason.',
  },
  {
    name: 'Draft',
    words:
      'Every length on the drawing is a field, every point moves a number. Change one and the whole pattern follows: facing, sleeve, pocket.',
  },
  {
    name: 'Check',
    words:
      'Seams are walked for you, to half a millimetre. Sleeves are solved to fit their armhole. What cannot be sewn is refused, with the range that works.',
  },
  {
    name: 'Teach',
    words:
      'Each point keeps the sum behind it, so a student can follow it, and work it again on her own measurements.',
  },
  {
    name: 'Share',
    words:
      'One link shows the drawing to whoever should see it. The client is never in it, and you take it back when you like.',
  },
  {
    name: 'Print',
    words:
      'A4 or letter sheets that tape together true: test squares first, numbered match marks, a map, and no blank pages.',
  },
] as const

/** What the product does, in the order of the work. */
export function WhatItDoes() {
  return (
    <ol className="grid gap-x-10 gap-y-8 sm:grid-cols-2 lg:grid-cols-3">
      {parts.map(({ name, words }, index) => (
        <li key={name} className="border-t border-rule pt-3">
          <h3 className="text-lg font-semibold">
            <span className="mr-2 text-walnut tabular-nums">{index + 1}</span>
            {name}
          </h3>
          <p className="mt-1 max-w-90">{words}</p>
        </li>
      ))}
    </ol>
  )
}
