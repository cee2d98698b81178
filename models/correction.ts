import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { db } from '@/lib/db'

/** What was said wrong at a time, and what is right. */
export class Correction extends Model<InferAttributes<Correction>, InferCreationAttributes<Correction>> {
  declare id: CreationOptional<string>
  declare episodeId: string
  declare atMs: number
  declare said: string
  declare amended: string
  declare createdBy: CreationOptional<string | null>
  declare createdAt: CreationOptional<Date>
}

Correction.init(
  {
    id: { type: DataTypes.UUID, allowNull: false, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
    episodeId: { type: DataTypes.UUID, allowNull: false },
    atMs: { type: DataTypes.INTEGER, allowNull: false },
    said: { type: DataTypes.TEXT, allowNull: false },
    amended: { type: DataTypes.TEXT, allowNull: false },
    createdBy: { type: DataTypes.UUID, allowNull: true },
    createdAt: { type: DataTypes.DATE, allowNull: false },
  },
  { sequelize: db(), modelName: 'Correction', tableName: 'corrections', timestamps: true, updatedAt: false },
)
