import { DataTypes } from 'sequelize'

// Functions, because Sequelize writes into the object that describes a column: two columns must not share one.

/** Ids are UUID v7 made by the application: nothing depends on auto-increment. */
export const id = () => ({ type: DataTypes.UUID, primaryKey: true }) as const
export const reference = () => ({ type: DataTypes.UUID, allowNull: false }) as const
export const maybeReference = () => ({ type: DataTypes.UUID, allowNull: true }) as const
export const moment = () => ({ type: DataTypes.DATE(3), allowNull: false }) as const
export const maybeMoment = () => ({ type: DataTypes.DATE(3), allowNull: true }) as const
export const text = (length: number) => ({ type: DataTypes.STRING(length), allowNull: false }) as const
