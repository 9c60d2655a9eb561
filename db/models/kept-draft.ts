import 'server-only'
import { DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { connection } from '../connection'
import { id, moment, reference, text } from './columns'

/** The whole Draft of a printed or shared version, so that what was cut can always be printed again. */
export class KeptDraft extends Model<InferAttributes<KeptDraft>, InferCreationAttributes<KeptDraft>> {
  declare revisionId: string
  declare workroomId: string
  declare engineVersion: string
  declare drafted: Buffer
  declare keptAt: Date
}

KeptDraft.init(
  {
    revisionId: id(),
    workroomId: reference(),
    engineVersion: text(40),
    drafted: { type: DataTypes.BLOB('long'), allowNull: false },
    keptAt: moment(),
  },
  { sequelize: connection, tableName: 'kept_drafts', modelName: 'KeptDraft', timestamps: false },
)
