import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { db } from '@/lib/db'

/** A photo of a question, turned upright and stripped of its metadata. */
export class QuestionPhoto extends Model<InferAttributes<QuestionPhoto>, InferCreationAttributes<QuestionPhoto>> {
  declare id: CreationOptional<string>
  declare questionId: string
  declare name: string
  declare width: number
  declare height: number
  declare alt: CreationOptional<string>
  declare createdAt: CreationOptional<Date>
}

QuestionPhoto.init(
  {
    id: { type: DataTypes.UUID, allowNull: false, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
    questionId: { type: DataTypes.UUID, allowNull: false },
    name: { type: DataTypes.TEXT, allowNull: false },
    width: { type: DataTypes.INTEGER, allowNull: false },
    height: { type: DataTypes.INTEGER, allowNull: false },
    alt: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
    createdAt: { type: DataTypes.DATE, allowNull: false },
  },
  { sequelize: db(), modelName: 'QuestionPhoto', tableName: 'question_photos', timestamps: true, updatedAt: false },
)
