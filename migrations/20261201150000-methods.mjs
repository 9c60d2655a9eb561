import { DataTypes } from 'sequelize'

const when = { type: DataTypes.DATE(3), allowNull: false }
const base = {
  id: { type: DataTypes.UUID, primaryKey: true },
  workroomId: {
    type: DataTypes.UUID,
    allowNull: false,
    references: { model: 'workrooms', key: 'id' },
    onDelete: 'CASCADE',
  },
  name: { type: DataTypes.STRING(120), allowNull: false },
  // Raised by every change: a change names the version it was made on.
  version: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
  archivedAt: { type: DataTypes.DATE(3), allowNull: true },
  createdAt: when,
  updatedAt: when,
}

/** A workroom's own drafting methods and its own measurements. */
export const up = async ({ context: queryInterface }) => {
  await queryInterface.createTable('drafting_methods', {
    ...base,
    description: { type: DataTypes.TEXT, allowNull: false },
    // By garment: the rules that differ from the garment's own, each with formula and source.
    garments: { type: DataTypes.JSON, allowNull: false },
    copiedFrom: { type: DataTypes.STRING(60), allowNull: true },
  })
  await queryInterface.addIndex('drafting_methods', ['workroomId', 'name'], {
    name: 'drafting_methods_workroom_name',
  })
  await queryInterface.createTable('own_measurements', {
    ...base,
    // What formulas and cards call it. It never changes.
    measurement: { type: DataTypes.STRING(40), allowNull: false },
    how: { type: DataTypes.STRING(500), allowNull: false },
    // The order in which the workroom takes them.
    place: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false },
    // The lengths and what was typed, outside which a value is refused.
    least: { type: DataTypes.JSON, allowNull: false },
    most: { type: DataTypes.JSON, allowNull: false },
  })
  await queryInterface.addIndex('own_measurements', ['workroomId', 'measurement'], {
    name: 'own_measurements_workroom_measurement',
    unique: true,
  })
}

export const down = async ({ context: queryInterface }) => {
  for (const table of ['own_measurements', 'drafting_methods']) await queryInterface.dropTable(table)
}
