import { join } from 'node:path'
import sharp from 'sharp'
import { draftGarment, drawing, type DraftOrder } from '../../drafting'
import { arrange, patternLayers, toSvg } from '../../drafting/drawing'
import { sanityBodies } from '../../tests/support/bodies'

const folder = process.argv[2] ?? '.'

/** Two invented bodies, the ends of the published sizes, and one beyond them. mm */
const bodies: Readonly<Record<string, DraftOrder['measurements']>> = {
  one: sanityBodies.one,
  two: sanityBodies.two,
  smallest: { bust: 791, waist: 606, hip: 856, neckBase: 337 },
  largest: { bust: 1520, waist: 1360, hip: 1550 },
  beyond: { bust: 1640, waist: 1700, hip: 1600, height: 1500 },
}

const styles: Readonly<Record<string, Readonly<Record<string, DraftOrder['design']>>>> = {
  'flared-dress': {
    default: {},
    flaredSleeve: { sleeve: 'flared', neckShape: 'V', neckWidening: 20 },
    bare: { sleeve: 'none', neckShape: 'boat', hemWay: 'swung' },
    square: { neckShape: 'square', frontNeckDrop: 40, neckWidening: 30, sleeveLength: 560, flare: 0.125 },
    scoop: { neckShape: 'scoop' },
    sweetheart: { neckShape: 'sweetheart', sleeve: 'none' },
    puff: { sleeve: 'puff' },
    bell: { sleeve: 'bell' },
    short: { sleeve: 'short' },
    threeQuarter: { sleeve: 'three-quarter', flare: 0.125 },
    bishop: { sleeve: 'bishop' },
    cap: { sleeve: 'cap' },
    narrowShoulder: { sleeve: 'none', neckWidening: 70, frontNeckDrop: 80, backOpening: 'none', flare: 0.5 },
    buttons: { backOpening: 'button band', neckShape: 'V', buttonSize: 22 },
    keyhole: { backOpening: 'keyhole', sleeve: 'none' },
    high: { neckShape: 'high', backOpening: 'button band' },
    keyholeNeck: { neckShape: 'keyhole', backOpening: 'none' },
    peterPan: { collar: 'Peter Pan' },
    mandarin: { collar: 'mandarin', backOpening: 'none' },
    shirt: { collar: 'shirt', backOpening: 'button band' },
  },
  'shift-dress': {
    default: {},
    shoulder: { dartTo: 'shoulder', sleeve: 'short', hemFlare: 50 },
    plain: { waistDarts: false, waistIn: 0, pockets: false, backOpening: 'none' },
  },
  bodice: {
    buttons: { backOpening: 'button band', dartTo: 'shoulder', sleeve: 'plain' },
    side: {},
    shared: { dartSharedWith: 'waist', dartTo: 'shoulder' },
    centreFront: { dartTo: 'centre front', neckShape: 'V' },
    princess: { shaping: 'princess from the shoulder', sleeve: 'plain' },
    princessArmhole: { shaping: 'princess from the armhole' },
    shoulder: { dartTo: 'shoulder', sleeve: 'plain' },
    armhole: { dartTo: 'armhole', neckShape: 'V' },
    neck: { dartTo: 'neck', sleeve: 'flared' },
    sweetheart: { neckShape: 'sweetheart' },
    boat: { neckShape: 'boat', sleeve: 'cap' },
    scoop: { neckShape: 'scoop', dartTo: 'shoulder', sleeve: 'puff' },
    waist: { dartTo: 'waist', sleeve: 'plain' },
  },
  'straight-skirt': {
    default: {},
    slit: { walkingRoom: 'slit', frontDarts: 2, pockets: true },
    sideZip: { opening: 'side zip', backDarts: 1, waistband: false, length: 450 },
    patch: { patchPockets: true },
  },
  'a-line-skirt': {
    default: {},
    wide: { dartClosed: 1, flareMore: 40, frontDarts: 2, length: 800 },
    backOne: { backDarts: 1, opening: 'side zip', dartClosed: 0.3 },
  },
  'gored-skirt': {
    default: {},
    trumpet: { gores: 8, flareFrom: 'above the hem', length: 900, hemFlare: 80 },
    four: { gores: 5, hemFlare: 100, waistband: false, pockets: true },
  },
  'gathered-skirt': {
    default: {},
    full: { fullness: 2.5, opening: 'side zip', length: 900 },
  },
  'boxy-blouse': {
    default: {},
    kimono: { sleeve: 'kimono', hemFinish: 'band' },
    bare: { sleeve: 'none', neckShape: 'V' },
  },
  kaftan: {
    default: {},
    gusset: { overarmSlope: 20, neckShape: 'V', sideSlits: false },
    short: { sleeveReach: 0.3, length: 900, backOpening: 'keyhole' },
  },
  'waist-seam-dress': {
    aLine: { sleeve: 'plain' },
    straight: { skirt: 'straight', frontDarts: 2 },
    gored: { skirt: 'gored', gores: 8 },
    gathered: { skirt: 'gathered', pockets: true },
    circle: { skirt: 'circle' },
  },
  peplum: {
    round: {},
    gathered: { cut: 'gathered' },
  },
  'circle-skirt': {
    default: {},
    full: { share: '1', panels: 4, pockets: true },
    wide: { share: '1 1/2', panels: 3, waistband: false },
    quarter: { share: '1/4', panels: 1 },
  },
}

const layers = [...patternLayers, 'construction', 'dimension'] as const

for (const [garment, ways] of Object.entries(styles)) {
  for (const [way, design] of Object.entries(ways)) {
    for (const [body, measurements] of Object.entries(bodies)) {
      const name = `${garment}-${way}-${body}`
      try {
        const draft = draftGarment({ garment, measurements, design, unit: 'cm' })
        const sheet = drawing(draft, { places: arrange(draft), unit: 'cm', layers, title: { name } })
        const svg = Buffer.from(toSvg(sheet, { title: name }))
        await sharp(svg, { density: 30, limitInputPixels: false })
          .resize({ width: 1800 })
          .flatten({ background: '#fffdf8' })
          .png()
          .toFile(join(folder, `${name}.png`))
        console.log(name, draft.cautions.map((caution) => caution.code).join(' '))
      } catch (error) {
        console.log(name, 'refused:', error instanceof Error ? error.message : error)
      }
    }
  }
}
