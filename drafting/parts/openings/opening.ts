import type { Edge, EdgeRole } from '../../contract'
import type { Pen } from '../../pen/pen'
import type { PiecePen } from '../../pen/piece-pen'

/** A half whose centre is still to be drawn, from a mark at its foot up to `centreNeck`. */
export interface OpenHalf {
  readonly piece: PiecePen
  /** The mark where the centre ends below. */
  readonly foot: string
  /** The edge that ends there, and what becomes of it: a lap runs on beyond the centre. */
  readonly below: {
    readonly edge: string
    readonly role: EdgeRole
    readonly allowance: string
    readonly finish?: Edge['finish']
  }
}

/** How the centre of a half ends, which its facing and a collar follow. */
export interface Centre {
  /** On the fold; a seam that opens for a zip; lapped over for buttons; or a seam that stays closed. */
  readonly kind: 'fold' | 'zip' | 'lap' | 'seam'
  /** mm down the centre from the neckline that the facing must cover beyond its own depth: a keyhole. */
  readonly keyhole?: { readonly depth: number; readonly half: number }
  /** Whether the centre is slit so that the neck goes over the head. */
  readonly slit?: boolean
  readonly below?: OpenHalf['below']
}

export interface Centres {
  readonly front: Centre
  readonly back: Centre
}

/** A way into a garment: draws both centres of its body. */
export interface Opening {
  /** @param dropped how far a keyhole neckline opens the centre front already, mm. */
  readonly draw: (pen: Pen, front: OpenHalf, back: OpenHalf, dropped: number) => Centres
}

/** Lays the centre of a half on the fold. */
export function onFold({ piece, foot }: OpenHalf): void {
  piece.line('centre', foot, 'centreNeck', {
    role: 'fold',
    say: `The centre ${piece.id} lies on the fold`,
  })
}
