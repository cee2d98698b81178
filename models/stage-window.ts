import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { db } from '@/lib/db'

/** From when to when a planting stands in a growth stage. */
export class StageWindow extends Model<InferAttributes<StageWindow>, InferCreationAttributes<StageWindow>> {
  declare id: CreationOptional<string>
  declare plantingId: string
  declare stage: 'soil' | '0' | '1' | '2' | '3' | '4' | '5' | '6' | '7' | '8' | '9'
  declare startsOn: string
  declare endsOn: string
}

StageWindow.init(
  {
    id: { type: DataTypes.UUID, allowNull: false, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
    plantingId: { type: DataTypes.UUID, allowNull: false },
    stage: { type: DataTypes.TEXT, allowNull: false },
    startsOn: { type: DataTypes.DATEONLY, allowNull: false },
    endsOn: { type: DataTypes.DATEONLY, allowNull: false },
  },
  { sequelize: db(), modelName: 'StageWindow', tableName: 'stage_windows', timestamps: false },
)
