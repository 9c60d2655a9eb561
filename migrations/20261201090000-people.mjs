import { DataTypes } from 'sequelize'

const id = { type: DataTypes.UUID, primaryKey: true }
const when = { type: DataTypes.DATE(3), allowNull: false }
const maybeWhen = { type: DataTypes.DATE(3), allowNull: true }
const to = (model, onDelete = 'CASCADE') => ({ references: { model, key: 'id' }, onDelete })
const stamps = { createdAt: when, updatedAt: when }

/** People, their workrooms, what they may do there, and how they prove who they are. */
export const up = async ({ context: queryInterface }) => {
  await queryInterface.createTable('users', {
    id,
    // Compared byte for byte: a collation that folds accents would let one address stand in for another.
    email: { type: DataTypes.STRING(254, true), allowNull: false, unique: true },
    name: { type: DataTypes.STRING(120), allowNull: false },
    passwordHash: { type: DataTypes.STRING(255), allowNull: false },
    disabledAt: maybeWhen,
    ...stamps,
  })
  await queryInterface.createTable('workrooms', {
    id,
    name: { type: DataTypes.STRING(120), allowNull: false },
    note: { type: DataTypes.STRING(500), allowNull: false, defaultValue: '' },
    unit: { type: DataTypes.STRING(2), allowNull: false },
    currency: { type: DataTypes.CHAR(3), allowNull: false },
    timeZone: { type: DataTypes.STRING(64), allowNull: false },
    allowances: { type: DataTypes.JSON, allowNull: false },
    ...stamps,
  })
  await queryInterface.createTable('memberships', {
    id,
    workroomId: { type: DataTypes.UUID, allowNull: false, ...to('workrooms') },
    userId: { type: DataTypes.UUID, allowNull: false, ...to('users') },
    disabledAt: maybeWhen,
    ...stamps,
  })
  await queryInterface.addIndex('memberships', ['workroomId', 'userId'], {
    unique: true,
    name: 'memberships_workroom_user',
  })
  await queryInterface.createTable('membership_roles', {
    membershipId: { type: DataTypes.UUID, primaryKey: true, ...to('memberships') },
    role: { type: DataTypes.STRING(16), primaryKey: true },
    workroomId: { type: DataTypes.UUID, allowNull: false, ...to('workrooms') },
  })
  await queryInterface.createTable('sessions', {
    id,
    userId: { type: DataTypes.UUID, allowNull: false, ...to('users') },
    workroomId: { type: DataTypes.UUID, allowNull: true, ...to('workrooms', 'SET NULL') },
    startedAt: when,
    lastSeenAt: when,
    endedAt: maybeWhen,
  })
  await queryInterface.createTable('tokens', {
    id,
    kind: { type: DataTypes.STRING(16), allowNull: false },
    tokenHash: { type: DataTypes.CHAR(64), allowNull: false, unique: true },
    email: { type: DataTypes.STRING(254, true), allowNull: false },
    userId: { type: DataTypes.UUID, allowNull: true, ...to('users') },
    workroomId: { type: DataTypes.UUID, allowNull: true, ...to('workrooms') },
    details: { type: DataTypes.JSON, allowNull: false },
    createdAt: when,
    expiresAt: when,
    usedAt: maybeWhen,
  })
  await queryInterface.addIndex('tokens', ['workroomId', 'kind'], { name: 'tokens_workroom_kind' })
  await queryInterface.createTable('attempts', {
    scope: { type: DataTypes.STRING(24), primaryKey: true },
    // A hash: the table is no list of addresses that were tried.
    subject: { type: DataTypes.CHAR(64), primaryKey: true },
    windowEnds: when,
    count: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
  })
}

export const down = async ({ context: queryInterface }) => {
  for (const table of [
    'attempts',
    'tokens',
    'sessions',
    'membership_roles',
    'memberships',
    'workrooms',
    'users',
  ])
    await queryInterface.dropTable(table)
}
