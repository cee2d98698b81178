import { DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { db } from '@/lib/db'

/** A second of an episode at which a term is heard. */
export class Hearing extends Model<InferAttributes<Hearing>, InferCreationAttributes<Hearing>> {
  declare termId: string
  declare episodeId: string
  declare atMs: number
  declare text: string
}

Hearing.init(
  {
    termId: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
    episodeId: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
    atMs: { type: DataTypes.INTEGER, allowNull: false, primaryKey: true },
    text: { type: DataTypes.TEXT, allowNull: false },
  },
  { sequelize: db(), modelName: 'Hearing', tableName: 'hearings', timestamps: false },
)
