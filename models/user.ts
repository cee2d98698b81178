import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { db } from '@/lib/db'

/** A person with a way to sign in. */
export class User extends Model<InferAttributes<User>, InferCreationAttributes<User>> {
  declare id: CreationOptional<string>
  declare email: string
  declare name: string
  declare passwordHash: CreationOptional<string | null>
  declare isAdmin: CreationOptional<boolean>
  declare units: CreationOptional<'us' | 'metric'>
  declare language: CreationOptional<string>
  declare emailVerified: CreationOptional<Date | null>
  declare disabledAt: CreationOptional<Date | null>
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
}

User.init(
  {
    id: { type: DataTypes.UUID, allowNull: false, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
    email: { type: DataTypes.TEXT, allowNull: false },
    name: { type: DataTypes.TEXT, allowNull: false },
    passwordHash: { type: DataTypes.TEXT, allowNull: true },
    isAdmin: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: false },
    units: { type: DataTypes.TEXT, allowNull: false, defaultValue: 'us' },
    language: { type: DataTypes.TEXT, allowNull: false, defaultValue: 'en' },
    emailVerified: { type: DataTypes.DATE, allowNull: true },
    disabledAt: { type: DataTypes.DATE, allowNull: true },
    createdAt: { type: DataTypes.DATE, allowNull: false },
    updatedAt: { type: DataTypes.DATE, allowNull: false },
  },
  { sequelize: db(), modelName: 'User', tableName: 'users' },
)
