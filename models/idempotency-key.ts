import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { db } from '@/lib/db'

/** What was answered to a creating POST, so that a retry gets the same. */
export class IdempotencyKey extends Model<InferAttributes<IdempotencyKey>, InferCreationAttributes<IdempotencyKey>> {
  declare userId: string
  declare key: string
  declare requestHash: string
  declare status: CreationOptional<number | null>
  declare headers: CreationOptional<Record<string, unknown> | null>
  declare body: CreationOptional<Record<string, unknown> | null>
  declare createdAt: CreationOptional<Date>
}

IdempotencyKey.init(
  {
    userId: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
    key: { type: DataTypes.TEXT, allowNull: false, primaryKey: true },
    requestHash: { type: DataTypes.TEXT, allowNull: false },
    status: { type: DataTypes.INTEGER, allowNull: true },
    headers: { type: DataTypes.JSONB, allowNull: true },
    body: { type: DataTypes.JSONB, allowNull: true },
    createdAt: { type: DataTypes.DATE, allowNull: false },
  },
  { sequelize: db(), modelName: 'IdempotencyKey', tableName: 'idempotency_keys', timestamps: true, updatedAt: false },
)
