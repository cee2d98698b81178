import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { db } from '@/lib/db'

/** A handbook article behind terms. */
export class Explainer extends Model<InferAttributes<Explainer>, InferCreationAttributes<Explainer>> {
  declare id: CreationOptional<string>
  declare slug: string
  declare title: string
  declare summary: CreationOptional<string>
  declare body: string
  declare caution: CreationOptional<string | null>
  declare state: CreationOptional<'draft' | 'in check' | 'checked' | 'due'>
  declare authorId: CreationOptional<string | null>
  declare checkedBy: CreationOptional<string | null>
  declare checkedOn: CreationOptional<string | null>
  declare edition: CreationOptional<number>
  declare contentHash: CreationOptional<string | null>
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
}

Explainer.init(
  {
    id: { type: DataTypes.UUID, allowNull: false, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
    slug: { type: DataTypes.TEXT, allowNull: false },
    title: { type: DataTypes.TEXT, allowNull: false },
    summary: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
    body: { type: DataTypes.TEXT, allowNull: false },
    caution: { type: DataTypes.TEXT, allowNull: true },
    state: { type: DataTypes.TEXT, allowNull: false, defaultValue: 'draft' },
    authorId: { type: DataTypes.UUID, allowNull: true },
    checkedBy: { type: DataTypes.UUID, allowNull: true },
    checkedOn: { type: DataTypes.DATEONLY, allowNull: true },
    edition: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
    contentHash: { type: DataTypes.TEXT, allowNull: true },
    createdAt: { type: DataTypes.DATE, allowNull: false },
    updatedAt: { type: DataTypes.DATE, allowNull: false },
  },
  { sequelize: db(), modelName: 'Explainer', tableName: 'explainers' },
)
