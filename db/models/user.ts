import 'server-only'
import { type CreationOptional, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { connection } from '../connection'
import { id, maybeMoment, moment, text } from './columns'

/** A person who can sign in. */
export class User extends Model<InferAttributes<User>, InferCreationAttributes<User>> {
  declare id: string
  declare email: string
  declare name: string
  declare passwordHash: string
  declare disabledAt: Date | null
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
}

User.init(
  {
    id: id(),
    email: text(254),
    name: text(120),
    passwordHash: text(255),
    disabledAt: maybeMoment(),
    createdAt: moment(),
    updatedAt: moment(),
  },
  { sequelize: connection, tableName: 'users', modelName: 'User', timestamps: true },
)
