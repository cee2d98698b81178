import { DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { db } from '@/lib/db'

/** What a chapter is filed under; codes from lib/topics. */
export class ChapterTopic extends Model<InferAttributes<ChapterTopic>, InferCreationAttributes<ChapterTopic>> {
  declare chapterId: string
  declare code: string
}

ChapterTopic.init(
  {
    chapterId: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
    code: { type: DataTypes.TEXT, allowNull: false, primaryKey: true },
  },
  { sequelize: db(), modelName: 'ChapterTopic', tableName: 'chapter_topics', timestamps: false },
)
