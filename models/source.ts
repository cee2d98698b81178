import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { db } from '@/lib/db'

/** A publication that claims are held against. */
export class Source extends Model<InferAttributes<Source>, InferCreationAttributes<Source>> {
  declare id: CreationOptional<string>
  declare key: string
  declare title: string
  declare authors: CreationOptional<string[]>
  declare publisher: CreationOptional<string | null>
  declare year: CreationOptional<number | null>
  declare url: CreationOptional<string | null>
  declare csl: CreationOptional<Record<string, unknown>>
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
}

Source.init(
  {
    id: { type: DataTypes.UUID, allowNull: false, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
    key: { type: DataTypes.TEXT, allowNull: false },
    title: { type: DataTypes.TEXT, allowNull: false },
    authors: { type: DataTypes.ARRAY(DataTypes.TEXT), allowNull: false, defaultValue: [] },
    publisher: { type: DataTypes.TEXT, allowNull: true },
    year: { type: DataTypes.INTEGER, allowNull: true },
    url: { type: DataTypes.TEXT, allowNull: true },
    csl: { type: DataTypes.JSONB, allowNull: false, defaultValue: {} },
    createdAt: { type: DataTypes.DATE, allowNull: false },
    updatedAt: { type: DataTypes.DATE, allowNull: false },
  },
  { sequelize: db(), modelName: 'Source', tableName: 'sources' },
)
