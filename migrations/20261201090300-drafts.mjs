import { DataTypes } from 'sequelize'

const id = { type: DataTypes.UUID, primaryKey: true }
const when = { type: DataTypes.DATE(3), allowNull: false }
const maybeWhen = { type: DataTypes.DATE(3), allowNull: true }
const to = (model, onDelete) => ({
  type: DataTypes.UUID,
  references: { model, key: 'id' },
  allowNull: onDelete === 'SET NULL',
  onDelete,
})

/** Drafts, their append-only versions, what was kept of the printed ones, and the links they are shared by. */
export const up = async ({ context: queryInterface }) => {
  await queryInterface.createTable('drafts', {
    id,
    workroomId: to('workrooms', 'CASCADE'),
    name: { type: DataTypes.STRING(120), allowNull: false },
    garment: { type: DataTypes.STRING(40), allowNull: false },
    purpose: { type: DataTypes.STRING(16), allowNull: false },
    clientId: to('clients', 'SET NULL'),
    cardId: to('measure_cards', 'SET NULL'),
    madeBy: to('memberships', 'SET NULL'),
    assignedTo: to('memberships', 'SET NULL'),
    // The version that counts. No foreign key: the two tables would point at each other.
    headId: { type: DataTypes.UUID, allowNull: false },
    archivedAt: maybeWhen,
    createdAt: when,
    updatedAt: when,
  })
  await queryInterface.addIndex('drafts', ['workroomId', 'updatedAt'], { name: 'drafts_workroom_updated' })
  await queryInterface.createTable('revisions', {
    id,
    workroomId: to('workrooms', 'CASCADE'),
    draftId: to('drafts', 'CASCADE'),
    basedOn: { type: DataTypes.UUID, allowNull: true },
    order: { type: DataTypes.JSON, allowNull: false },
    typed: { type: DataTypes.JSON, allowNull: false },
    // SHA-256 of what was sent: the same id with the same body is a retry.
    bodyHash: { type: DataTypes.CHAR(64), allowNull: false },
    kind: { type: DataTypes.STRING(8), allowNull: false },
    name: { type: DataTypes.STRING(120), allowNull: true },
    engineVersion: { type: DataTypes.STRING(40), allowNull: false },
    conflict: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: false },
    madeBy: to('memberships', 'SET NULL'),
    savedAt: when,
    printedAt: maybeWhen,
    sharedAt: maybeWhen,
  })
  await queryInterface.addIndex('revisions', ['draftId', 'savedAt'], { name: 'revisions_draft_saved' })
  await queryInterface.createTable('kept_drafts', {
    revisionId: { ...to('revisions', 'CASCADE'), primaryKey: true },
    workroomId: to('workrooms', 'CASCADE'),
    engineVersion: { type: DataTypes.STRING(40), allowNull: false },
    // gzipped JSON of the whole Draft.
    drafted: { type: DataTypes.BLOB('long'), allowNull: false },
    keptAt: when,
  })
  await queryInterface.createTable('shares', {
    id,
    workroomId: to('workrooms', 'CASCADE'),
    draftId: to('drafts', 'CASCADE'),
    tokenHash: { type: DataTypes.CHAR(64), allowNull: false, unique: true },
    scope: { type: DataTypes.STRING(8), allowNull: false },
    expiresOn: { type: DataTypes.DATEONLY, allowNull: false },
    // The end of that day in the workroom's time zone.
    expiresAt: when,
    revokedAt: maybeWhen,
    madeBy: to('memberships', 'SET NULL'),
    createdAt: when,
  })
}

export const down = async ({ context: queryInterface }) => {
  for (const table of ['shares', 'kept_drafts', 'revisions', 'drafts']) await queryInterface.dropTable(table)
}
