/** A fault put into the engine on purpose, and the law that must notice it. */
export interface Mutant {
  readonly law: number
  readonly name: string
  /** Below `drafting/`. */
  readonly file: string
  /** Stands in the file exactly once; otherwise the mutant is out of date. */
  readonly find: string
  readonly put: string
}

type Row = readonly [name: string, file: string, find: string, put: string]

const onlyOnMarks = 'return this.onTape(value)'

const byLaw: Readonly<Record<number, readonly Row[]>> = {
  1: [
    [
      'an arc’s end no longer stands on its mark',
      'parts/fitted-waist.ts',
      '...(index === last ? { to } : {}),',
      '',
    ],
    [
      'the cut line loses its first stretch',
      'pieces/finish.ts',
      'cutLine: cut.cutLine,',
      'cutLine: { ...cut.cutLine, segments: cut.cutLine.segments.slice(1) },',
    ],
    [
      'a corner of the waistband is no number',
      'parts/waistband.ts',
      "band.square('lowMeets', 'meets', 'lowEnd',",
      "band.place('lowMeets', { x: NaN, y: 0 },",
    ],
  ],
  2: [
    [
      'a princess seam is longer round the bust on the side panel',
      'parts/bodice/princess.ts',
      'const [shift, more] = solvePair(off)',
      'const [shift, more] = solvePair(off).map(() => 0) as [number, number]',
    ],
    [
      'the front of a shift dress has its side 2 mm lower',
      'parts/shift/lower.ts',
      'y: back.at(id).y + to.y - from.y }',
      'y: back.at(id).y + to.y - from.y + 2 }',
    ],
    [
      'a gusset is set into the back of the sleeve by 2 mm too little',
      'parts/kimono/gusset.ts',
      "a: [run(half, 'sleeve-under', sleeve)],",
      "a: [run(half, 'sleeve-under', half === 'back' ? sleeve + 2 : sleeve)],",
    ],
    [
      'a skirt is 3 mm wider at the waist than the bodice that it is sewn to',
      'parts/skirts/fitted.ts',
      'wanted: sewnTo ? [sewnTo.front.length, sewnTo.back.length]',
      'wanted: sewnTo ? [sewnTo.front.length + 3, sewnTo.back.length]',
    ],
    [
      'the sides of skirt and bodice miss each other by 2 mm',
      'parts/skirts/waist.ts',
      'const by = index === 0 ? found.outward : -found.outward',
      'const by = index === 0 ? found.outward + 2 : -found.outward - 2',
    ],
    [
      'the hem of a bishop sleeve is 2 mm longer than its cuff gathers',
      'parts/sleeves/bishop.ts',
      "+ pen.value('bishopGather')",
      "+ pen.value('bishopGather') + 2",
    ],
    [
      'the binding of an armhole under a cap is left off behind',
      'parts/sleeves/armhole-binding.ts',
      '.reverse(),',
      '.slice(1),',
    ],
    [
      'the hem of a puff is 2 mm longer than its band gathers',
      'parts/sleeves/puff.ts',
      "+ pen.value('puffGather')",
      "+ pen.value('puffGather') + 2",
    ],
    [
      'the back’s side seam is 1 mm longer',
      'parts/flared-half.ts',
      'direction, pen.length(by), {',
      "direction, pen.length(by) + (piece.id === 'back' ? 1 : 0), {",
    ],
    [
      'the shoulder seam is dropped',
      'pen/pen.ts',
      'this.seams.push(plan)',
      "if (plan.id !== 'shoulder') this.seams.push(plan)",
    ],
    [
      'seams claim 2 mm more ease than their rule gives',
      'pieces/seams.ts',
      'pen.value(plan.easeFrom) : 0',
      'pen.value(plan.easeFrom) + 2 : 0',
    ],
    [
      'notches are moved 3 mm on',
      'pieces/runs.ts',
      'from + length - within : from + within }',
      'from + length - within + 3 : from + within + 3 }',
    ],
    [
      'a flat collar is 2 % longer behind than the neckline',
      'parts/collars/peter-pan.ts',
      'drawn((100 * long.back)',
      'drawn((102 * long.back)',
    ],
    [
      'a collar’s upper layer is sewn to the body and its under layer too',
      'parts/sew-neck.ts',
      '...(facing ? { mirrored: true } : {})',
      '...(facing ? {} : {})',
    ],
    [
      'a stand is drawn on a wrong radius',
      'parts/collars/stand.ts',
      'const radius = half / turn',
      'const radius = half / turn + 8',
    ],
    [
      'what falls over does not fit its stand',
      'parts/collars/shirt.ts',
      'const radius = long / turn',
      'const radius = long / turn + 3',
    ],
    [
      'the facing of a lapped front is sewn to the top of its edge only',
      'parts/neck-facing.ts',
      "a: [{ piece: body.id, edge: 'opening' }],",
      "a: [{ piece: body.id, edge: 'opening', to: 100 }],",
    ],
    [
      'a stretch beside the pocket is sewn twice',
      'parts/pockets/in-seam.ts',
      'a: stretch(a, mouth.to, length),',
      'a: stretch(a, mouth.to - 5, length),',
    ],
  ],
  3: [
    [
      'levels stop short of the side',
      'parts/levels.ts',
      'straight({ x: 0, y }, met.point)',
      'straight({ x: 0, y }, { x: met.point.x - 1, y })',
    ],
    [
      'fits claim more than is drawn',
      'pen/pen.ts',
      'sum + one.times * one.length, 0),',
      'sum + one.times * one.length, 5),',
    ],
    [
      'quarters are 1 mm narrow',
      'garments/flared-dress.ts',
      "'(bust + bustEase) / 4'",
      "'(bust + bustEase) / 4 - 0.1cm'",
    ],
  ],
  4: [
    [
      'necklines meet the fold slanting',
      'parts/necklines/neckline.ts',
      '{ x: centre.x + run, y: centre.y }',
      '{ x: centre.x + run, y: centre.y - run * 0.04 }',
    ],
    [
      'hems meet the side at 87°',
      'parts/flared-half.ts',
      '{ x: -direction.y, y: direction.x }, middle',
      '{ x: -direction.y, y: direction.x + 0.05 }, middle',
    ],
  ],
  5: [
    [
      'the back neckline turns 8° at the shoulder',
      'parts/neck-lean.ts',
      'back: ofBack }',
      'back: ofBack + 8 }',
    ],
    [
      'armholes meet the side seam slanting',
      'parts/armhole.ts',
      '{ x: side.y, y: -side.x }',
      '{ x: side.y, y: -side.x + 0.08 }',
    ],
  ],
  6: [
    [
      'allowances are 0.2 mm wide',
      'pieces/cut-line.ts',
      'offsetPath(edge.path, allowance)',
      'offsetPath(edge.path, allowance && allowance + 0.2)',
    ],
    [
      'allowances lie inside the piece',
      'pieces/cut-line.ts',
      'offsetPath(edge.path, allowance)',
      'offsetPath(edge.path, -allowance)',
    ],
    [
      'offsets are fitted loosely',
      'geometry/offset-cubic.ts',
      'const TOLERANCE = 0.012',
      'const TOLERANCE = 0.5',
    ],
    ['no caution says that an allowance was too wide', 'pieces/finish.ts', "'allowance-clipped',", "'',"],
  ],
  7: [
    [
      'a kimono sleeve may end inside the body',
      'parts/kimono/layout.ts',
      'const clear = Math.min(',
      'const clear = 100 + Math.max(0, ',
    ],
    [
      'the front of the head is 1 mm short',
      'parts/sleeves/set-in.ts',
      'armhole.front + pen.value(kind.ease.front),',
      'armhole.front + pen.value(kind.ease.front) - 1,',
    ],
    [
      'cuts are spread 2 mm less',
      'parts/slash-and-spread.ts',
      'Math.asin((spreads[index] as number) / 2 /',
      'Math.asin(((spreads[index] as number) - 2) / 2 /',
    ],
    [
      'the cuts of a bishop sleeve open alike in front and behind',
      'parts/slash-and-spread.ts',
      'index < cuts / 2 ? by.backSpread',
      'index < 0 ? by.backSpread',
    ],
    [
      'a cap covers 2 mm less of the front armhole',
      'parts/sleeves/cap.ts',
      'front: reach * armhole.front,',
      'front: reach * armhole.front - 2,',
    ],
  ],
  8: [
    [
      'the waist is swung 0.5 mm wide',
      'parts/skirts/circle.ts',
      'arcPath(apex, radius, from, to)',
      'arcPath(apex, radius + 0.5, from, to)',
    ],
    ['π is 3.14', 'parts/skirts/circle.ts', '2 * pi *', '2 * 3.14 *'],
  ],
  9: [
    [
      'a construction forgets what it read',
      'pen/pen.ts',
      'const uses = this.trail\n',
      'const uses = nothing\n',
    ],
    [
      'steps leave out what rules follow from',
      'pen/values.ts',
      'mask |= this.mask(inner)',
      'mask |= this.mask(inner) & 0n',
    ],
    [
      'inches are drawn a little larger',
      'pen/pen.ts',
      onlyOnMarks,
      "return this.onTape(this.unit === 'in' ? value + 0.01 : value)",
    ],
    [
      'a draft remembers the one before it',
      'pen/pen.ts',
      onlyOnMarks,
      'const kept = globalThis as { drawn?: number }\n    kept.drawn = (kept.drawn ?? 0) + 1\n    return this.onTape(value + kept.drawn * 1e-7)',
    ],
  ],
  10: [
    ['cautions are dropped', 'pen/pen.ts', 'this.cautions.push({ code, message, fields })', ''],
    [
      'what is out of range is drawn',
      'pen/check-order.ts',
      'const { min = -Infinity, max = Infinity } = value\n',
      "const { min = -Infinity, max = Infinity } = value\n  if (value.kind === 'length' && isNumber(given)) return undefined\n",
    ],
    [
      'long dresses are clamped silently',
      'pen/check-order.ts',
      'design[id] = given[id] as DesignChoice',
      "design[id] = id === 'length' ? Math.min(given[id] as number, 900) : (given[id] as DesignChoice)",
    ],
  ],
  11: [
    [
      'handles pull the wrong way',
      'handles.ts',
      'x: (to.x - from.x) / moved,',
      'x: (from.x - to.x) / moved,',
    ],
    [
      'handles are 5 % too strong',
      'handles.ts',
      'perMm: near.change / moved,',
      'perMm: (near.change / moved) * 1.05,',
    ],
  ],
  12: [
    ['steps make no mark', 'pen/piece-pen.ts', 'marks: [own],', 'marks: [],'],
    [
      'steps say 2 mm more than they draw',
      'pen/write-steps.ts',
      'step.length = record.length',
      'step.length = record.length + 2',
    ],
    [
      'edges name a step that drew something else',
      'pen/piece-pen.ts',
      'madeBy: step,',
      "madeBy: this.pen.steps[0]?.id ?? '',",
    ],
  ],
  13: [
    [
      'lengths jump every fifth of a millimetre',
      'pen/pen.ts',
      onlyOnMarks,
      'return this.onTape(value > 300 && Math.floor(value * 5) % 2 ? value + 6 : value)',
    ],
  ],
  14: [
    [
      'armholes have a kink at the hollow',
      'parts/armhole.ts',
      '{ x: hollow.x, y: hollow.y + fall * 0.66 }',
      '{ x: hollow.x - 3, y: hollow.y + fall * 0.66 }',
    ],
    [
      'necklines bend both ways',
      'parts/necklines/neckline.ts',
      '{ x: centre.x + run, y: centre.y }',
      '{ x: centre.x + run * 0.1, y: centre.y - depth * 0.9 }',
    ],
  ],
  15: [
    [
      'a measurement counts without being declared',
      'draft-garment.ts',
      'new Values(ready.rules, ready.measurements,',
      'new Values(ready.rules, { ...ready.measurements, waist: (ready.measurements.waist ?? 0) + (order.measurements.bustSpan ?? 0) / 100 },',
    ],
    [
      'a measurement is asked for and not used',
      'garments/flared-dress.ts',
      '...sleeveEstimates,',
      "...sleeveEstimates, 'elbow',",
    ],
  ],
  16: [
    [
      'a bust dart keeps its angle about its own point instead of the bust point',
      'parts/bodice/open-darts.ts',
      '(one.degrees * one.dart.degrees) / wide',
      'one.degrees',
    ],
  ],
  17: [
    [
      'slits are half as long as they must be',
      'parts/openings/head-room.ts',
      'Math.max(60, Math.ceil(short / 5) * 5)',
      'Math.ceil(short / 2)',
    ],
    [
      'a lapped front carries half its button',
      'parts/openings/button-band.ts',
      "'buttonSize / 2 + 0.6cm'",
      "'buttonSize / 4 + 0.6cm'",
    ],
    [
      'buttons run past the bust',
      'parts/openings/button-levels.ts',
      'const even = (bust - first) / spaces',
      'const even = (bust - first) / (spaces + 0.5)',
    ],
    [
      'a stand is taken to be as wide above as below',
      'parts/openings/head-room.ts',
      '(half - shorter)',
      'half',
    ],
    [
      'a keyhole is too shallow for the head',
      'parts/openings/keyhole.ts',
      'Math.max(wanted, ',
      'Math.min(wanted, ',
    ],
    [
      'the close neck is much wider than the neck',
      'garments/flared-dress.ts',
      "'neckBase / 5 - 0.35cm'",
      "'neckBase / 5 + 0.35cm'",
    ],
  ],
  18: [
    [
      'the side seam is taken in on the front only',
      'parts/flared-half.ts',
      "takenInOf(pen, 'side', top, bottom, 60)",
      "takenInOf(pen, 'side', top, bottom, 60).filter(() => piece.id === 'front')",
    ],
    [
      'a skirt is taken in on the front only',
      'parts/take-in.ts',
      '.flatMap((id) => pen.corrections.forSeam(id))',
      ".flatMap((id) => (piece.id === 'front' ? pen.corrections.forSeam(id) : []))",
    ],
    [
      'a shared mark is corrected on one side only',
      'pen/corrections.ts',
      'if (correction.on.piece !== piece && !shared) continue',
      'if (correction.on.piece !== piece) continue',
    ],
    [
      'corrections switched off are still made',
      'pen/corrections.ts',
      "if (correction.off || typeof correction.by === 'number') continue",
      "if (typeof correction.by === 'number') continue",
    ],
  ],
  19: [
    [
      'the tape is not read',
      'pen/pen.ts',
      'return this.tape ? Math.round(length / this.tape) * this.tape : length',
      'return length',
    ],
    [
      'sums on a tape end beside the distance',
      'pen/write-steps.ts',
      'pen.unit, record.length)\n',
      'pen.unit, record.length + (pen.tape ?? 0))\n',
    ],
  ],
}

export const mutants: readonly Mutant[] = Object.entries(byLaw).flatMap(([law, rows]) =>
  rows.map(([name, file, find, put]) => ({ law: Number(law), name, file, find, put })),
)
