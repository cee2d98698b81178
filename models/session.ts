import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { db } from '@/lib/db'

/** One sign-in of one person; ended on the server when they sign out. */
export class Session extends Model<InferAttributes<Session>, InferCreationAttributes<Session>> {
  declare id: CreationOptional<string>
  declare userId: string
  declare createdAt: CreationOptional<Date>
  declare expiresAt: Date
  declare endedAt: CreationOptional<Date | null>
}

Session.init(
  {
    id: { type: DataTypes.UUID, allowNull: false, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
    userId: { type: DataTypes.UUID, allowNull: false },
    createdAt: { type: DataTypes.DATE, allowNull: false },
    expiresAt: { type: DataTypes.DATE, allowNull: false },
    endedAt: { type: DataTypes.DATE, allowNull: true },
  },
  { sequelize: db(), modelName: 'Session', tableName: 'sessions', timestamps: true, updatedAt: false },
)
