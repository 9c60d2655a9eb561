/** What the pattern is called on paper. All of it is read by people, none of it is looked up. */
export interface PatternTitle {
  /** Of the draft. */
  readonly name: string
  /** 'Flared dress' */
  readonly garment: string
  /** 'version 3' */
  readonly version?: string
  /** As it is to be read. */
  readonly date?: string
  /** The workroom it comes from. */
  readonly maker: string
}
