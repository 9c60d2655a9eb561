import 'server-only'
import { DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { connection } from '../connection'
import { id, moment, reference, text } from './columns'

/** A printer as one person measured it. */
export class Printer extends Model<InferAttributes<Printer>, InferCreationAttributes<Printer>> {
  declare id: string
  declare userId: string
  declare name: string
  /** mm of 100, across the paper's short side and along its long side. */
  declare short: number
  declare long: number
  declare measuredAt: Date
}

Printer.init(
  {
    id: id(),
    userId: reference(),
    name: text(60),
    short: { type: DataTypes.DOUBLE, allowNull: false },
    long: { type: DataTypes.DOUBLE, allowNull: false },
    measuredAt: moment(),
  },
  { sequelize: connection, tableName: 'printers', modelName: 'Printer', timestamps: false },
)
