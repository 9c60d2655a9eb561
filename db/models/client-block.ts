import 'server-only'
import { type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { connection } from '../connection'
import { id, maybeReference, moment, reference, text } from './columns'

/** Which version of which draft is a client's block for a garment. */
export class ClientBlock extends Model<InferAttributes<ClientBlock>, InferCreationAttributes<ClientBlock>> {
  declare id: string
  declare workroomId: string
  declare clientId: string
  declare garment: string
  declare draftId: string
  declare revisionId: string
  declare setBy: string | null
  declare setAt: Date
}

ClientBlock.init(
  {
    id: id(),
    workroomId: reference(),
    clientId: reference(),
    garment: text(40),
    draftId: reference(),
    revisionId: reference(),
    setBy: maybeReference(),
    setAt: moment(),
  },
  { sequelize: connection, tableName: 'client_blocks', modelName: 'ClientBlock', timestamps: false },
)
