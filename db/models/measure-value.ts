import 'server-only'
import { DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { connection } from '../connection'
import type { Unit } from '../shapes/length'
import { id, reference, text } from './columns'

/** One measurement on a card: millimetres for the arithmetic, and what was typed. */
export class MeasureValue extends Model<
  InferAttributes<MeasureValue>,
  InferCreationAttributes<MeasureValue>
> {
  declare cardId: string
  declare measurement: string
  declare workroomId: string
  declare mm: string
  declare typed: string
  declare unit: Unit
}

MeasureValue.init(
  {
    cardId: id(),
    measurement: { type: DataTypes.STRING(40), primaryKey: true },
    workroomId: reference(),
    mm: { type: DataTypes.DECIMAL(9, 3), allowNull: false },
    typed: text(40),
    unit: text(2),
  },
  { sequelize: connection, tableName: 'measure_values', modelName: 'MeasureValue', timestamps: false },
)
