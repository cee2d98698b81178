import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { db } from '@/lib/db'

/** A fact about this installation, such as that the demo was seeded. */
export class Mark extends Model<InferAttributes<Mark>, InferCreationAttributes<Mark>> {
  declare key: string
  declare value: unknown
  declare setAt: CreationOptional<Date>
}

Mark.init(
  {
    key: { type: DataTypes.TEXT, allowNull: false, primaryKey: true },
    value: { type: DataTypes.JSONB, allowNull: false },
    setAt: { type: DataTypes.DATE, allowNull: false, defaultValue: DataTypes.NOW },
  },
  { sequelize: db(), modelName: 'Mark', tableName: 'marks', timestamps: false },
)
