import { DataTypes } from 'sequelize'

/** Printers as people measured them: a person has a name once. */
export const up = async ({ context: queryInterface }) => {
  await queryInterface.createTable('printers', {
    id: { type: DataTypes.UUID, primaryKey: true },
    userId: {
      type: DataTypes.UUID,
      allowNull: false,
      references: { model: 'users', key: 'id' },
      onDelete: 'CASCADE',
    },
    name: { type: DataTypes.STRING(60), allowNull: false },
    short: { type: DataTypes.DOUBLE, allowNull: false },
    long: { type: DataTypes.DOUBLE, allowNull: false },
    measuredAt: { type: DataTypes.DATE(3), allowNull: false },
  })
  await queryInterface.addIndex('printers', ['userId', 'name'], { name: 'printers_user_name', unique: true })
}

export const down = async ({ context: queryInterface }) => {
  await queryInterface.dropTable('printers')
}
