import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { db } from '@/lib/db'

/** A viewer's question and where it stands. */
export class Question extends Model<InferAttributes<Question>, InferCreationAttributes<Question>> {
  declare id: CreationOptional<string>
  declare channelId: string
  declare askerId: CreationOptional<string | null>
  declare title: string
  declare body: CreationOptional<string>
  declare episodeId: CreationOptional<string | null>
  declare atMs: CreationOptional<number | null>
  declare crop: CreationOptional<string | null>
  declare stage: CreationOptional<string | null>
  declare state: CreationOptional<'new' | 'queued' | 'booked' | 'answered' | 'set-aside' | 'joined'>
  declare setAsideReason: CreationOptional<string | null>
  declare joinedInto: CreationOptional<string | null>
  declare bookedEpisodeId: CreationOptional<string | null>
  declare answeredAt: CreationOptional<Date | null>
  declare edition: CreationOptional<number>
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
}

Question.init(
  {
    id: { type: DataTypes.UUID, allowNull: false, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
    channelId: { type: DataTypes.UUID, allowNull: false },
    askerId: { type: DataTypes.UUID, allowNull: true },
    title: { type: DataTypes.TEXT, allowNull: false },
    body: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
    episodeId: { type: DataTypes.UUID, allowNull: true },
    atMs: { type: DataTypes.INTEGER, allowNull: true },
    crop: { type: DataTypes.TEXT, allowNull: true },
    stage: { type: DataTypes.TEXT, allowNull: true },
    state: { type: DataTypes.TEXT, allowNull: false, defaultValue: 'new' },
    setAsideReason: { type: DataTypes.TEXT, allowNull: true },
    joinedInto: { type: DataTypes.UUID, allowNull: true },
    bookedEpisodeId: { type: DataTypes.UUID, allowNull: true },
    answeredAt: { type: DataTypes.DATE, allowNull: true },
    edition: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
    createdAt: { type: DataTypes.DATE, allowNull: false },
    updatedAt: { type: DataTypes.DATE, allowNull: false },
  },
  { sequelize: db(), modelName: 'Question', tableName: 'questions' },
)
