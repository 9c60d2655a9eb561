import 'server-only'
import { DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { connection } from '../connection'
import type { ShareScope } from '../shapes/share'
import { id, maybeMoment, maybeReference, moment, reference, text } from './columns'

/** A link by which anyone may see one draft until it expires or is revoked. */
export class Share extends Model<InferAttributes<Share>, InferCreationAttributes<Share>> {
  declare id: string
  declare workroomId: string
  declare draftId: string
  declare tokenHash: string
  declare scope: ShareScope
  declare expiresOn: string
  declare expiresAt: Date
  declare revokedAt: Date | null
  declare madeBy: string | null
  declare createdAt: Date
}

Share.init(
  {
    id: id(),
    workroomId: reference(),
    draftId: reference(),
    tokenHash: { type: DataTypes.CHAR(64), allowNull: false },
    scope: text(8),
    expiresOn: { type: DataTypes.DATEONLY, allowNull: false },
    expiresAt: moment(),
    revokedAt: maybeMoment(),
    madeBy: maybeReference(),
    createdAt: moment(),
  },
  { sequelize: connection, tableName: 'shares', modelName: 'Share', timestamps: false },
)
