import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { db } from '@/lib/db'

/** One move of a question: who, when, from where to where. */
export class QuestionEvent extends Model<InferAttributes<QuestionEvent>, InferCreationAttributes<QuestionEvent>> {
  declare id: CreationOptional<string>
  declare questionId: string
  declare actorId: CreationOptional<string | null>
  declare move: string
  declare fromState: CreationOptional<string | null>
  declare toState: string
  declare detail: CreationOptional<string | null>
  declare createdAt: CreationOptional<Date>
}

QuestionEvent.init(
  {
    id: { type: DataTypes.UUID, allowNull: false, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
    questionId: { type: DataTypes.UUID, allowNull: false },
    actorId: { type: DataTypes.UUID, allowNull: true },
    move: { type: DataTypes.TEXT, allowNull: false },
    fromState: { type: DataTypes.TEXT, allowNull: true },
    toState: { type: DataTypes.TEXT, allowNull: false },
    detail: { type: DataTypes.TEXT, allowNull: true },
    createdAt: { type: DataTypes.DATE, allowNull: false },
  },
  { sequelize: db(), modelName: 'QuestionEvent', tableName: 'question_events', timestamps: true, updatedAt: false },
)
