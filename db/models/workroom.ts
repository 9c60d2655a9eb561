import 'server-only'
import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
} from 'sequelize'
import { connection } from '../connection'
import type { Allowances } from '../shapes/workroom'
import type { Unit } from '../shapes/length'
import { id, moment, text } from './columns'

/** The tenant: one dressmaking business or school. Every other row of its data carries its id. */
export class Workroom extends Model<InferAttributes<Workroom>, InferCreationAttributes<Workroom>> {
  declare id: string
  declare name: string
  declare note: string
  declare unit: Unit
  declare currency: string
  declare timeZone: string
  declare allowances: Allowances
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
}

Workroom.init(
  {
    id: id(),
    name: text(120),
    note: text(500),
    unit: text(2),
    currency: text(3),
    timeZone: text(64),
    allowances: { type: DataTypes.JSON, allowNull: false },
    createdAt: moment(),
    updatedAt: moment(),
  },
  { sequelize: connection, tableName: 'workrooms', modelName: 'Workroom', timestamps: true },
)
