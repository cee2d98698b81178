import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { db } from '@/lib/db'

/** A file as filmed and what became of it; the id is the upload id. */
export class Footage extends Model<InferAttributes<Footage>, InferCreationAttributes<Footage>> {
  declare id: string
  declare episodeId: string
  declare uploadedBy: CreationOptional<string | null>
  declare filename: string
  declare filetype: CreationOptional<string | null>
  declare bytes: number
  declare state: CreationOptional<'receiving' | 'inspecting' | 'encoding' | 'ready' | 'failed'>
  declare step: CreationOptional<string | null>
  declare progress: CreationOptional<number>
  declare errorCode: CreationOptional<string | null>
  declare errorDetail: CreationOptional<string | null>
  declare film: CreationOptional<Record<string, unknown> | null>
  declare durationMs: CreationOptional<number | null>
  declare folder: CreationOptional<string | null>
  declare attempt: CreationOptional<number>
  declare expiresAt: CreationOptional<Date | null>
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
}

Footage.init(
  {
    id: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
    episodeId: { type: DataTypes.UUID, allowNull: false },
    uploadedBy: { type: DataTypes.UUID, allowNull: true },
    filename: { type: DataTypes.TEXT, allowNull: false },
    filetype: { type: DataTypes.TEXT, allowNull: true },
    bytes: {
      type: DataTypes.BIGINT,
      get() {
        return Number(this.getDataValue('bytes'))
      },
      allowNull: false,
    },
    state: { type: DataTypes.TEXT, allowNull: false, defaultValue: 'receiving' },
    step: { type: DataTypes.TEXT, allowNull: true },
    progress: { type: DataTypes.DOUBLE, allowNull: false, defaultValue: 0 },
    errorCode: { type: DataTypes.TEXT, allowNull: true },
    errorDetail: { type: DataTypes.TEXT, allowNull: true },
    film: { type: DataTypes.JSONB, allowNull: true },
    durationMs: { type: DataTypes.INTEGER, allowNull: true },
    folder: { type: DataTypes.TEXT, allowNull: true },
    attempt: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 0 },
    expiresAt: { type: DataTypes.DATE, allowNull: true },
    createdAt: { type: DataTypes.DATE, allowNull: false },
    updatedAt: { type: DataTypes.DATE, allowNull: false },
  },
  { sequelize: db(), modelName: 'Footage', tableName: 'footages' },
)
