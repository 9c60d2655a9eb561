import 'server-only'
import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
} from 'sequelize'
import { connection } from '../connection'
import type { DraftingMethod as Method } from '../../drafting/contract'
import { id, maybeMoment, moment, reference, text } from './columns'

/** A workroom's own drafting method: the rules in which it differs from the garments' own. */
export class DraftingMethod extends Model<
  InferAttributes<DraftingMethod>,
  InferCreationAttributes<DraftingMethod>
> {
  declare id: string
  declare workroomId: string
  declare name: string
  declare description: string
  declare garments: Method['garments']
  /** The built-in method that it was copied from. */
  declare copiedFrom: string | null
  declare version: number
  declare archivedAt: Date | null
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
}

DraftingMethod.init(
  {
    id: id(),
    workroomId: reference(),
    name: text(120),
    description: { type: DataTypes.TEXT, allowNull: false },
    garments: { type: DataTypes.JSON, allowNull: false },
    copiedFrom: { type: DataTypes.STRING(60), allowNull: true },
    version: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
    archivedAt: maybeMoment(),
    createdAt: moment(),
    updatedAt: moment(),
  },
  { sequelize: connection, tableName: 'drafting_methods', modelName: 'DraftingMethod', timestamps: true },
)
