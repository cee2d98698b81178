import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { db } from '@/lib/db'

/** A token a person made for their scripts; only its hash is kept. */
export class ApiToken extends Model<InferAttributes<ApiToken>, InferCreationAttributes<ApiToken>> {
  declare id: CreationOptional<string>
  declare userId: string
  declare name: string
  declare tokenHash: string
  declare createdAt: CreationOptional<Date>
  declare lastUsedAt: CreationOptional<Date | null>
  declare endedAt: CreationOptional<Date | null>
}

ApiToken.init(
  {
    id: { type: DataTypes.UUID, allowNull: false, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
    userId: { type: DataTypes.UUID, allowNull: false },
    name: { type: DataTypes.TEXT, allowNull: false },
    tokenHash: { type: DataTypes.TEXT, allowNull: false },
    createdAt: { type: DataTypes.DATE, allowNull: false },
    lastUsedAt: { type: DataTypes.DATE, allowNull: true },
    endedAt: { type: DataTypes.DATE, allowNull: true },
  },
  { sequelize: db(), modelName: 'ApiToken', tableName: 'api_tokens', timestamps: true, updatedAt: false },
)
