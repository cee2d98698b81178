import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { db } from '@/lib/db'

/** The captions of an episode in one language. */
export class CaptionTrack extends Model<InferAttributes<CaptionTrack>, InferCreationAttributes<CaptionTrack>> {
  declare id: CreationOptional<string>
  declare episodeId: string
  declare language: string
  declare kind: CreationOptional<'captions' | 'subtitles' | 'descriptions'>
  declare label: string
  declare checked: CreationOptional<boolean>
  declare edition: CreationOptional<number>
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
}

CaptionTrack.init(
  {
    id: { type: DataTypes.UUID, allowNull: false, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
    episodeId: { type: DataTypes.UUID, allowNull: false },
    language: { type: DataTypes.TEXT, allowNull: false },
    kind: { type: DataTypes.TEXT, allowNull: false, defaultValue: 'captions' },
    label: { type: DataTypes.TEXT, allowNull: false },
    checked: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: true },
    edition: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
    createdAt: { type: DataTypes.DATE, allowNull: false },
    updatedAt: { type: DataTypes.DATE, allowNull: false },
  },
  { sequelize: db(), modelName: 'CaptionTrack', tableName: 'caption_tracks' },
)
