import 'server-only'
import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
} from 'sequelize'
import { connection } from '../connection'
import type { DraftOrder } from '../../drafting/contract'
import type { RevisionKind } from '../shapes/revision'
import { id, maybeMoment, maybeReference, moment, reference, text } from './columns'

/** A saved state of a draft. Append-only: only printedAt and sharedAt are ever written again. */
export class Revision extends Model<InferAttributes<Revision>, InferCreationAttributes<Revision>> {
  declare id: string
  declare workroomId: string
  declare draftId: string
  declare basedOn: string | null
  declare order: DraftOrder
  declare typed: Readonly<Record<string, string>>
  declare bodyHash: string
  declare kind: RevisionKind
  declare name: string | null
  declare engineVersion: string
  declare conflict: CreationOptional<boolean>
  declare madeBy: string | null
  declare savedAt: Date
  declare printedAt: Date | null
  declare sharedAt: Date | null
}

Revision.init(
  {
    id: id(),
    workroomId: reference(),
    draftId: reference(),
    basedOn: maybeReference(),
    order: { type: DataTypes.JSON, allowNull: false },
    typed: { type: DataTypes.JSON, allowNull: false },
    bodyHash: { type: DataTypes.CHAR(64), allowNull: false },
    kind: text(8),
    name: { type: DataTypes.STRING(120), allowNull: true },
    engineVersion: text(40),
    conflict: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: false },
    madeBy: maybeReference(),
    savedAt: moment(),
    printedAt: maybeMoment(),
    sharedAt: maybeMoment(),
  },
  { sequelize: connection, tableName: 'revisions', modelName: 'Revision', timestamps: false },
)
