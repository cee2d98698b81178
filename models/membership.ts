import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { db } from '@/lib/db'

/** A person's role in one channel. */
export class Membership extends Model<InferAttributes<Membership>, InferCreationAttributes<Membership>> {
  declare channelId: string
  declare userId: string
  declare role: 'owner' | 'editor' | 'adviser'
  declare createdAt: CreationOptional<Date>
}

Membership.init(
  {
    channelId: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
    userId: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
    role: { type: DataTypes.TEXT, allowNull: false },
    createdAt: { type: DataTypes.DATE, allowNull: false },
  },
  { sequelize: db(), modelName: 'Membership', tableName: 'memberships', timestamps: true, updatedAt: false },
)
