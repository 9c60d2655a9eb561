import { DataTypes } from 'sequelize'

const id = { type: DataTypes.UUID, primaryKey: true }
const when = { type: DataTypes.DATE(3), allowNull: false }
const workroomId = {
  type: DataTypes.UUID,
  allowNull: false,
  references: { model: 'workrooms', key: 'id' },
  onDelete: 'CASCADE',
}

/** Clients and their measure cards. A card belongs to a client, or to a member (a student's own). */
export const up = async ({ context: queryInterface }) => {
  await queryInterface.createTable('clients', {
    id,
    workroomId,
    name: { type: DataTypes.STRING(120), allowNull: false },
    email: { type: DataTypes.STRING(254), allowNull: false, defaultValue: '' },
    phone: { type: DataTypes.STRING(40), allowNull: false, defaultValue: '' },
    note: { type: DataTypes.TEXT, allowNull: false },
    archivedAt: { type: DataTypes.DATE(3), allowNull: true },
    createdAt: when,
    updatedAt: when,
  })
  await queryInterface.addIndex('clients', ['workroomId', 'name'], { name: 'clients_workroom_name' })
  await queryInterface.createTable('measure_cards', {
    id,
    workroomId,
    clientId: {
      type: DataTypes.UUID,
      allowNull: true,
      references: { model: 'clients', key: 'id' },
      onDelete: 'CASCADE',
    },
    membershipId: {
      type: DataTypes.UUID,
      allowNull: true,
      references: { model: 'memberships', key: 'id' },
      onDelete: 'CASCADE',
    },
    name: { type: DataTypes.STRING(120), allowNull: false },
    takenOn: { type: DataTypes.DATEONLY, allowNull: false },
    unit: { type: DataTypes.STRING(2), allowNull: false },
    note: { type: DataTypes.TEXT, allowNull: false },
    createdAt: when,
    updatedAt: when,
  })
  await queryInterface.createTable('measure_values', {
    cardId: {
      type: DataTypes.UUID,
      primaryKey: true,
      references: { model: 'measure_cards', key: 'id' },
      onDelete: 'CASCADE',
    },
    measurement: { type: DataTypes.STRING(40), primaryKey: true },
    workroomId,
    // The length and what was typed: 36½ stays 36½.
    mm: { type: DataTypes.DECIMAL(9, 3), allowNull: false },
    typed: { type: DataTypes.STRING(40), allowNull: false },
    unit: { type: DataTypes.STRING(2), allowNull: false },
  })
}

export const down = async ({ context: queryInterface }) => {
  for (const table of ['measure_values', 'measure_cards', 'clients']) await queryInterface.dropTable(table)
}
