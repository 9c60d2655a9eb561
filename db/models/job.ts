import 'server-only'
import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
} from 'sequelize'
import { connection } from '../connection'
import { id, maybeMoment, maybeReference, moment, text } from './columns'

/** A piece of background work. It is waiting while neither done nor failed. */
export class Job extends Model<InferAttributes<Job>, InferCreationAttributes<Job>> {
  declare id: string
  declare kind: string
  declare payload: Readonly<Record<string, unknown>>
  declare workroomId: string | null
  declare createdAt: Date
  declare runAfter: Date
  declare attempts: CreationOptional<number>
  declare leaseOwner: string | null
  declare leaseUntil: Date | null
  declare doneAt: Date | null
  declare failedAt: Date | null
  declare lastError: string | null
}

Job.init(
  {
    id: id(),
    kind: text(32),
    payload: { type: DataTypes.JSON, allowNull: false },
    workroomId: maybeReference(),
    createdAt: moment(),
    runAfter: moment(),
    attempts: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false, defaultValue: 0 },
    leaseOwner: maybeReference(),
    leaseUntil: maybeMoment(),
    doneAt: maybeMoment(),
    failedAt: maybeMoment(),
    lastError: { type: DataTypes.STRING(200), allowNull: true },
  },
  { sequelize: connection, tableName: 'jobs', modelName: 'Job', timestamps: false },
)
