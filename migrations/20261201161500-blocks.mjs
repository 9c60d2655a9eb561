import { DataTypes } from 'sequelize'

const to = (model, onDelete) => ({
  type: DataTypes.UUID,
  references: { model, key: 'id' },
  allowNull: onDelete === 'SET NULL',
  onDelete,
})

/** The corrected base draft of a client, one for each garment, from which later styles start. */
export const up = async ({ context: queryInterface }) => {
  await queryInterface.createTable('client_blocks', {
    id: { type: DataTypes.UUID, primaryKey: true },
    workroomId: to('workrooms', 'CASCADE'),
    clientId: to('clients', 'CASCADE'),
    garment: { type: DataTypes.STRING(40), allowNull: false },
    draftId: to('drafts', 'CASCADE'),
    revisionId: to('revisions', 'CASCADE'),
    setBy: to('memberships', 'SET NULL'),
    setAt: { type: DataTypes.DATE(3), allowNull: false },
  })
  await queryInterface.addIndex('client_blocks', ['clientId', 'garment'], {
    name: 'client_blocks_client_garment',
    unique: true,
  })
}

export const down = async ({ context: queryInterface }) => {
  await queryInterface.dropTable('client_blocks')
}
