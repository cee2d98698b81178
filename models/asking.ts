import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { db } from '@/lib/db'

/** One person who wants the question answered, the asker included. */
export class Asking extends Model<InferAttributes<Asking>, InferCreationAttributes<Asking>> {
  declare questionId: string
  declare userId: string
  declare createdAt: CreationOptional<Date>
}

Asking.init(
  {
    questionId: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
    userId: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
    createdAt: { type: DataTypes.DATE, allowNull: false },
  },
  { sequelize: db(), modelName: 'Asking', tableName: 'askings', timestamps: true, updatedAt: false },
)
