import { DataTypes } from 'sequelize'

const maybeWhen = { type: DataTypes.DATE(3), allowNull: true }
const when = { type: DataTypes.DATE(3), allowNull: false }

/** Background work: written in the transaction that wants it done, done once after the commit. */
export const up = async ({ context: queryInterface }) => {
  await queryInterface.createTable('jobs', {
    id: { type: DataTypes.UUID, primaryKey: true },
    kind: { type: DataTypes.STRING(32), allowNull: false },
    payload: { type: DataTypes.JSON, allowNull: false },
    workroomId: {
      type: DataTypes.UUID,
      allowNull: true,
      references: { model: 'workrooms', key: 'id' },
      onDelete: 'CASCADE',
    },
    createdAt: when,
    runAfter: when,
    attempts: { type: DataTypes.INTEGER.UNSIGNED, allowNull: false, defaultValue: 0 },
    leaseOwner: { type: DataTypes.UUID, allowNull: true },
    leaseUntil: maybeWhen,
    doneAt: maybeWhen,
    failedAt: maybeWhen,
    lastError: { type: DataTypes.STRING(200), allowNull: true },
  })
  await queryInterface.addIndex('jobs', ['doneAt', 'failedAt', 'runAfter'], { name: 'jobs_waiting' })
}

export const down = async ({ context: queryInterface }) => {
  await queryInterface.dropTable('jobs')
}
