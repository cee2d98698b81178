import { DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { db } from '@/lib/db'

/** How often something was tried since its window opened. */
export class Throttle extends Model<InferAttributes<Throttle>, InferCreationAttributes<Throttle>> {
  declare key: string
  declare count: number
  declare openedAt: Date
}

Throttle.init(
  {
    key: { type: DataTypes.TEXT, allowNull: false, primaryKey: true },
    count: { type: DataTypes.INTEGER, allowNull: false },
    openedAt: { type: DataTypes.DATE, allowNull: false },
  },
  { sequelize: db(), modelName: 'Throttle', tableName: 'throttles', timestamps: false },
)
