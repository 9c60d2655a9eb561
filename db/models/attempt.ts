import 'server-only'
import { DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { connection } from '../connection'
import { moment } from './columns'

/** How often something that may be guessed was tried in the current window, shared by all processes. */
export class Attempt extends Model<InferAttributes<Attempt>, InferCreationAttributes<Attempt>> {
  declare scope: string
  declare subject: string
  declare windowEnds: Date
  declare count: number
}

Attempt.init(
  {
    scope: { type: DataTypes.STRING(24), primaryKey: true },
    subject: { type: DataTypes.CHAR(64), primaryKey: true },
    windowEnds: moment(),
    count: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
  },
  { sequelize: connection, tableName: 'attempts', modelName: 'Attempt', timestamps: false },
)
