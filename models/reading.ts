import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { db } from '@/lib/db'

/** A measurement said on camera. */
export class Reading extends Model<InferAttributes<Reading>, InferCreationAttributes<Reading>> {
  declare id: CreationOptional<string>
  declare episodeId: string
  declare atMs: number
  declare quantity: string
  declare value: number
  declare unit: string
  declare note: CreationOptional<string | null>
}

Reading.init(
  {
    id: { type: DataTypes.UUID, allowNull: false, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
    episodeId: { type: DataTypes.UUID, allowNull: false },
    atMs: { type: DataTypes.INTEGER, allowNull: false },
    quantity: { type: DataTypes.TEXT, allowNull: false },
    value: { type: DataTypes.DOUBLE, allowNull: false },
    unit: { type: DataTypes.TEXT, allowNull: false },
    note: { type: DataTypes.TEXT, allowNull: true },
  },
  { sequelize: db(), modelName: 'Reading', tableName: 'readings', timestamps: false },
)
