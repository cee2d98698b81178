import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { db } from '@/lib/db'

/** A titled stretch: it lasts until the next one starts. */
export class Chapter extends Model<InferAttributes<Chapter>, InferCreationAttributes<Chapter>> {
  declare id: CreationOptional<string>
  declare episodeId: string
  declare startMs: number
  declare title: string
}

Chapter.init(
  {
    id: { type: DataTypes.UUID, allowNull: false, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
    episodeId: { type: DataTypes.UUID, allowNull: false },
    startMs: { type: DataTypes.INTEGER, allowNull: false },
    title: { type: DataTypes.TEXT, allowNull: false },
  },
  { sequelize: db(), modelName: 'Chapter', tableName: 'chapters', timestamps: false },
)
