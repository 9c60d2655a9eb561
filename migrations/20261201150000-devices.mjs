import { DataTypes } from 'sequelize'

/** On which device somebody signed in, in words, so that they can tell their sessions apart. */
export const up = async ({ context: queryInterface }) => {
  await queryInterface.addColumn('sessions', 'device', {
    type: DataTypes.STRING(80),
    allowNull: false,
    defaultValue: '',
  })
}

export const down = async ({ context: queryInterface }) => {
  // The dialect's own way of dropping a column stumbles over its answer about foreign keys.
  await queryInterface.sequelize.query('ALTER TABLE sessions DROP COLUMN device')
}
