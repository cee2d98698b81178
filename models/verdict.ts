import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { db } from '@/lib/db'

/** Whether an asker's question is settled. */
export class Verdict extends Model<InferAttributes<Verdict>, InferCreationAttributes<Verdict>> {
  declare questionId: string
  declare userId: string
  declare settled: boolean
  declare note: CreationOptional<string | null>
  declare createdAt: CreationOptional<Date>
}

Verdict.init(
  {
    questionId: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
    userId: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
    settled: { type: DataTypes.BOOLEAN, allowNull: false },
    note: { type: DataTypes.TEXT, allowNull: true },
    createdAt: { type: DataTypes.DATE, allowNull: false },
  },
  { sequelize: db(), modelName: 'Verdict', tableName: 'verdicts', timestamps: true, updatedAt: false },
)
