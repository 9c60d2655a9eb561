import 'server-only'
import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
} from 'sequelize'
import { connection } from '../connection'
import type { Length } from '../shapes/length'
import { id, maybeMoment, moment, reference, text } from './columns'

/** A measurement that a workroom takes beside those that the garments know. */
export class OwnMeasurement extends Model<
  InferAttributes<OwnMeasurement>,
  InferCreationAttributes<OwnMeasurement>
> {
  declare id: string
  declare workroomId: string
  declare measurement: string
  declare name: string
  declare how: string
  declare place: number
  declare least: Length
  declare most: Length
  declare version: number
  declare archivedAt: Date | null
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
}

OwnMeasurement.init(
  {
    id: id(),
    workroomId: reference(),
    measurement: text(40),
    name: text(120),
    how: text(500),
    place: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
    least: { type: DataTypes.JSON, allowNull: false },
    most: { type: DataTypes.JSON, allowNull: false },
    version: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
    archivedAt: maybeMoment(),
    createdAt: moment(),
    updatedAt: moment(),
  },
  { sequelize: connection, tableName: 'own_measurements', modelName: 'OwnMeasurement', timestamps: true },
)
