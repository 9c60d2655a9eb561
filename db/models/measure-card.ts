import 'server-only'
import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
} from 'sequelize'
import { connection } from '../connection'
import type { Unit } from '../shapes/length'
import { id, maybeReference, moment, reference, text } from './columns'

/** One dated set of body measurements of a client, or of a member (a student's own). */
export class MeasureCard extends Model<InferAttributes<MeasureCard>, InferCreationAttributes<MeasureCard>> {
  declare id: string
  declare workroomId: string
  declare clientId: string | null
  declare membershipId: string | null
  declare name: string
  declare takenOn: string
  declare unit: Unit
  declare note: string
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
}

MeasureCard.init(
  {
    id: id(),
    workroomId: reference(),
    clientId: maybeReference(),
    membershipId: maybeReference(),
    name: text(120),
    takenOn: { type: DataTypes.DATEONLY, allowNull: false },
    unit: text(2),
    note: { type: DataTypes.TEXT, allowNull: false },
    createdAt: moment(),
    updatedAt: moment(),
  },
  { sequelize: connection, tableName: 'measure_cards', modelName: 'MeasureCard', timestamps: true },
)
