import 'server-only'
import { type CreationOptional, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { connection } from '../connection'
import type { DraftPurpose } from '../shapes/draft'
import { id, maybeMoment, maybeReference, moment, reference, text } from './columns'

/** A draft: what it is called, for whom, and which of its versions counts. */
export class Draft extends Model<InferAttributes<Draft>, InferCreationAttributes<Draft>> {
  declare id: string
  declare workroomId: string
  declare name: string
  declare garment: string
  declare purpose: DraftPurpose
  declare clientId: string | null
  declare cardId: string | null
  declare madeBy: string | null
  declare assignedTo: string | null
  declare headId: string
  declare archivedAt: Date | null
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
}

Draft.init(
  {
    id: id(),
    workroomId: reference(),
    name: text(120),
    garment: text(40),
    purpose: text(16),
    clientId: maybeReference(),
    cardId: maybeReference(),
    madeBy: maybeReference(),
    assignedTo: maybeReference(),
    headId: reference(),
    archivedAt: maybeMoment(),
    createdAt: moment(),
    updatedAt: moment(),
  },
  { sequelize: connection, tableName: 'drafts', modelName: 'Draft', timestamps: true },
)
