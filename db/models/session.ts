import 'server-only'
import { type CreationOptional, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { connection } from '../connection'
import { id, maybeMoment, maybeReference, moment, reference, text } from './columns'

/** One sign-in on one device. The cookie carries its id; the row decides whether it still counts. */
export class Session extends Model<InferAttributes<Session>, InferCreationAttributes<Session>> {
  declare id: string
  declare userId: string
  declare workroomId: string | null
  declare startedAt: Date
  declare lastSeenAt: Date
  declare endedAt: Date | null
  /** In words; '' when it is not known. */
  declare device: CreationOptional<string>
}

Session.init(
  {
    id: id(),
    userId: reference(),
    workroomId: maybeReference(),
    startedAt: moment(),
    lastSeenAt: moment(),
    endedAt: maybeMoment(),
    device: { ...text(80), defaultValue: '' },
  },
  { sequelize: connection, tableName: 'sessions', modelName: 'Session', timestamps: false },
)
