import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { db } from '@/lib/db'

/** One caption: what is said from when to when. */
export class Cue extends Model<InferAttributes<Cue>, InferCreationAttributes<Cue>> {
  declare id: CreationOptional<string>
  declare trackId: string
  declare startMs: number
  declare endMs: number
  /** WebVTT cue text: escaped, with the few tags that are kept. */
  declare text: string
  /** The same words without markup: what is read aloud, searched and underlined. */
  declare plain: string
  declare speaker: CreationOptional<string | null>
  declare settings: CreationOptional<string | null>
}

Cue.init(
  {
    id: { type: DataTypes.UUID, allowNull: false, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
    trackId: { type: DataTypes.UUID, allowNull: false },
    startMs: { type: DataTypes.INTEGER, allowNull: false },
    endMs: { type: DataTypes.INTEGER, allowNull: false },
    text: { type: DataTypes.TEXT, allowNull: false },
    plain: { type: DataTypes.TEXT, allowNull: false },
    speaker: { type: DataTypes.TEXT, allowNull: true },
    settings: { type: DataTypes.TEXT, allowNull: true },
  },
  { sequelize: db(), modelName: 'Cue', tableName: 'cues', timestamps: false },
)
