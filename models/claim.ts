import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { db } from '@/lib/db'

/** A checkable statement of an explainer. */
export class Claim extends Model<InferAttributes<Claim>, InferCreationAttributes<Claim>> {
  declare id: CreationOptional<string>
  declare explainerId: string
  declare key: string
  declare statement: string
  declare quantity: CreationOptional<string | null>
  declare low: CreationOptional<number | null>
  declare high: CreationOptional<number | null>
  declare unit: CreationOptional<string | null>
  declare sourceId: CreationOptional<string | null>
  declare locator: CreationOptional<string | null>
  declare basis: CreationOptional<string>
  declare verdict: CreationOptional<'agrees' | 'differs' | 'not found' | null>
  declare note: CreationOptional<string | null>
  declare checkedByName: CreationOptional<string | null>
  declare checkedBy: CreationOptional<string | null>
  declare checkedOn: CreationOptional<string | null>
  declare position: CreationOptional<number>
}

Claim.init(
  {
    id: { type: DataTypes.UUID, allowNull: false, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
    explainerId: { type: DataTypes.UUID, allowNull: false },
    key: { type: DataTypes.TEXT, allowNull: false },
    statement: { type: DataTypes.TEXT, allowNull: false },
    quantity: { type: DataTypes.TEXT, allowNull: true },
    low: { type: DataTypes.DOUBLE, allowNull: true },
    high: { type: DataTypes.DOUBLE, allowNull: true },
    unit: { type: DataTypes.TEXT, allowNull: true },
    sourceId: { type: DataTypes.UUID, allowNull: true },
    locator: { type: DataTypes.TEXT, allowNull: true },
    basis: { type: DataTypes.TEXT, allowNull: false, defaultValue: 'from memory' },
    verdict: { type: DataTypes.TEXT, allowNull: true },
    note: { type: DataTypes.TEXT, allowNull: true },
    checkedByName: { type: DataTypes.TEXT, allowNull: true },
    checkedBy: { type: DataTypes.UUID, allowNull: true },
    checkedOn: { type: DataTypes.DATEONLY, allowNull: true },
    position: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 0 },
  },
  { sequelize: db(), modelName: 'Claim', tableName: 'claims', timestamps: false },
)
