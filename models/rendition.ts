import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { db } from '@/lib/db'

/** One encoded size of a footage. */
export class Rendition extends Model<InferAttributes<Rendition>, InferCreationAttributes<Rendition>> {
  declare footageId: string
  declare height: number
  declare width: CreationOptional<number>
  declare bitrate: CreationOptional<number>
  declare bytes: CreationOptional<number>
  declare ready: CreationOptional<boolean>
}

Rendition.init(
  {
    footageId: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
    height: { type: DataTypes.INTEGER, allowNull: false, primaryKey: true },
    width: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 0 },
    bitrate: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 0 },
    bytes: {
      type: DataTypes.BIGINT,
      get() {
        return Number(this.getDataValue('bytes'))
      },
      allowNull: false,
      defaultValue: 0,
    },
    ready: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: false },
  },
  { sequelize: db(), modelName: 'Rendition', tableName: 'renditions', timestamps: false },
)
