import 'server-only'
import { DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { connection } from '../connection'
import type { Role } from '../permissions'
import type { Unit } from '../shapes/length'
import { id, maybeMoment, maybeReference, moment, text } from './columns'

export type TokenKind = 'join' | 'reset' | 'invitation'

/** What the link will do: the names given when joining, or the roles an invitation brings. */
export interface TokenDetails {
  readonly name?: string
  readonly workroomName?: string
  readonly unit?: Unit
  readonly roles?: readonly Role[]
  readonly invitedBy?: string
}

/** A link sent by mail that may be used once: to join, to reset a password, to accept an invitation. */
export class Token extends Model<InferAttributes<Token>, InferCreationAttributes<Token>> {
  declare id: string
  declare kind: TokenKind
  declare tokenHash: string
  declare email: string
  declare userId: string | null
  declare workroomId: string | null
  declare details: TokenDetails
  declare createdAt: Date
  declare expiresAt: Date
  declare usedAt: Date | null
}

Token.init(
  {
    id: id(),
    kind: text(16),
    tokenHash: { type: DataTypes.CHAR(64), allowNull: false },
    email: text(254),
    userId: maybeReference(),
    workroomId: maybeReference(),
    details: { type: DataTypes.JSON, allowNull: false },
    createdAt: moment(),
    expiresAt: moment(),
    usedAt: maybeMoment(),
  },
  { sequelize: connection, tableName: 'tokens', modelName: 'Token', timestamps: false },
)
