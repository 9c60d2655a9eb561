import 'server-only'
import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
} from 'sequelize'
import { connection } from '../connection'
import { id, maybeMoment, moment, reference, text } from './columns'

/** The person a garment is made for. */
export class Client extends Model<InferAttributes<Client>, InferCreationAttributes<Client>> {
  declare id: string
  declare workroomId: string
  declare name: string
  declare email: string
  declare phone: string
  declare note: string
  declare archivedAt: Date | null
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
}

Client.init(
  {
    id: id(),
    workroomId: reference(),
    name: text(120),
    email: text(254),
    phone: text(40),
    note: { type: DataTypes.TEXT, allowNull: false },
    archivedAt: maybeMoment(),
    createdAt: moment(),
    updatedAt: moment(),
  },
  { sequelize: connection, tableName: 'clients', modelName: 'Client', timestamps: true },
)
