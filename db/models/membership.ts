import 'server-only'
import { type CreationOptional, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { connection } from '../connection'
import { id, maybeMoment, moment, reference } from './columns'

/** One person in one workroom. */
export class Membership extends Model<InferAttributes<Membership>, InferCreationAttributes<Membership>> {
  declare id: string
  declare workroomId: string
  declare userId: string
  declare disabledAt: Date | null
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
}

Membership.init(
  {
    id: id(),
    workroomId: reference(),
    userId: reference(),
    disabledAt: maybeMoment(),
    createdAt: moment(),
    updatedAt: moment(),
  },
  { sequelize: connection, tableName: 'memberships', modelName: 'Membership', timestamps: true },
)
