import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { db } from '@/lib/db'

/** One crop on one field in a season. */
export class Planting extends Model<InferAttributes<Planting>, InferCreationAttributes<Planting>> {
  declare id: CreationOptional<string>
  declare seasonId: string
  declare crop: string
  declare field: string
  declare areaAcres: CreationOptional<number | null>
  declare plantedOn: CreationOptional<string | null>
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
}

Planting.init(
  {
    id: { type: DataTypes.UUID, allowNull: false, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
    seasonId: { type: DataTypes.UUID, allowNull: false },
    crop: { type: DataTypes.TEXT, allowNull: false },
    field: { type: DataTypes.TEXT, allowNull: false },
    areaAcres: { type: DataTypes.DOUBLE, allowNull: true },
    plantedOn: { type: DataTypes.DATEONLY, allowNull: true },
    createdAt: { type: DataTypes.DATE, allowNull: false },
    updatedAt: { type: DataTypes.DATE, allowNull: false },
  },
  { sequelize: db(), modelName: 'Planting', tableName: 'plantings' },
)
