import { DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { db } from '@/lib/db'

/** A link sent by mail, stored hashed, good once. */
export class VerificationToken extends Model<
  InferAttributes<VerificationToken>,
  InferCreationAttributes<VerificationToken>
> {
  declare identifier: string
  declare token: string
  declare expiresAt: Date
}

VerificationToken.init(
  {
    identifier: { type: DataTypes.TEXT, allowNull: false, primaryKey: true },
    token: { type: DataTypes.TEXT, allowNull: false, primaryKey: true },
    expiresAt: { type: DataTypes.DATE, allowNull: false },
  },
  { sequelize: db(), modelName: 'VerificationToken', tableName: 'verification_tokens', timestamps: false },
)
