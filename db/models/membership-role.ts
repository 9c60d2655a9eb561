import 'server-only'
import { DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { connection } from '../connection'
import type { Role } from '../permissions'
import { id, reference } from './columns'

/** One of the roles of a membership: an apprentice is maker and student. */
export class MembershipRole extends Model<
  InferAttributes<MembershipRole>,
  InferCreationAttributes<MembershipRole>
> {
  declare membershipId: string
  declare role: Role
  declare workroomId: string
}

MembershipRole.init(
  {
    membershipId: id(),
    role: { type: DataTypes.STRING(16), primaryKey: true },
    workroomId: reference(),
  },
  { sequelize: connection, tableName: 'membership_roles', modelName: 'MembershipRole', timestamps: false },
)
