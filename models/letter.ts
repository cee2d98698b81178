import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { db } from '@/lib/db'

/** A letter in the outbox: one per key. */
export class Letter extends Model<InferAttributes<Letter>, InferCreationAttributes<Letter>> {
  declare id: CreationOptional<string>
  declare key: string
  declare toAddress: string
  declare toName: CreationOptional<string | null>
  declare subject: string
  declare text: string
  declare html: CreationOptional<string | null>
  declare headers: CreationOptional<Record<string, unknown>>
  declare state: CreationOptional<'waiting' | 'sent' | 'failed'>
  declare attempts: CreationOptional<number>
  declare lastError: CreationOptional<string | null>
  declare sentAt: CreationOptional<Date | null>
  declare createdAt: CreationOptional<Date>
}

Letter.init(
  {
    id: { type: DataTypes.UUID, allowNull: false, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
    key: { type: DataTypes.TEXT, allowNull: false },
    toAddress: { type: DataTypes.TEXT, allowNull: false },
    toName: { type: DataTypes.TEXT, allowNull: true },
    subject: { type: DataTypes.TEXT, allowNull: false },
    text: { type: DataTypes.TEXT, allowNull: false },
    html: { type: DataTypes.TEXT, allowNull: true },
    headers: { type: DataTypes.JSONB, allowNull: false, defaultValue: {} },
    state: { type: DataTypes.TEXT, allowNull: false, defaultValue: 'waiting' },
    attempts: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 0 },
    lastError: { type: DataTypes.TEXT, allowNull: true },
    sentAt: { type: DataTypes.DATE, allowNull: true },
    createdAt: { type: DataTypes.DATE, allowNull: false },
  },
  { sequelize: db(), modelName: 'Letter', tableName: 'letters', timestamps: true, updatedAt: false },
)
