import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { db } from '@/lib/db'

/** One lesson video. Its `edition` is the ETag; `footageId` is the switch to the film that is shown. */
export class Episode extends Model<InferAttributes<Episode>, InferCreationAttributes<Episode>> {
  declare id: CreationOptional<string>
  declare channelId: string
  declare seasonId: CreationOptional<string | null>
  declare number: number
  declare slug: string
  declare title: string
  declare summary: CreationOptional<string | null>
  declare language: CreationOptional<string>
  declare filmedOn: CreationOptional<string | null>
  declare state: CreationOptional<'draft' | 'scheduled' | 'published' | 'withdrawn'>
  declare publishAt: CreationOptional<Date | null>
  declare publishedAt: CreationOptional<Date | null>
  declare withdrawnAt: CreationOptional<Date | null>
  declare cautionsConfirmedAt: CreationOptional<Date | null>
  declare cautionsConfirmedBy: CreationOptional<string | null>
  declare footageId: CreationOptional<string | null>
  declare edition: CreationOptional<number>
  declare createdBy: CreationOptional<string | null>
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
}

Episode.init(
  {
    id: { type: DataTypes.UUID, allowNull: false, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
    channelId: { type: DataTypes.UUID, allowNull: false },
    seasonId: { type: DataTypes.UUID, allowNull: true },
    number: { type: DataTypes.INTEGER, allowNull: false },
    slug: { type: DataTypes.TEXT, allowNull: false },
    title: { type: DataTypes.TEXT, allowNull: false },
    summary: { type: DataTypes.TEXT, allowNull: true },
    language: { type: DataTypes.TEXT, allowNull: false, defaultValue: 'en' },
    filmedOn: { type: DataTypes.DATEONLY, allowNull: true },
    state: { type: DataTypes.TEXT, allowNull: false, defaultValue: 'draft' },
    publishAt: { type: DataTypes.DATE, allowNull: true },
    publishedAt: { type: DataTypes.DATE, allowNull: true },
    withdrawnAt: { type: DataTypes.DATE, allowNull: true },
    cautionsConfirmedAt: { type: DataTypes.DATE, allowNull: true },
    cautionsConfirmedBy: { type: DataTypes.UUID, allowNull: true },
    footageId: { type: DataTypes.UUID, allowNull: true },
    edition: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
    createdBy: { type: DataTypes.UUID, allowNull: true },
    createdAt: { type: DataTypes.DATE, allowNull: false },
    updatedAt: { type: DataTypes.DATE, allowNull: false },
  },
  { sequelize: db(), modelName: 'Episode', tableName: 'episodes' },
)
