import { type CreationOptional, DataTypes, type InferAttributes, type InferCreationAttributes, Model } from 'sequelize'
import { db } from '@/lib/db'

/** What a term is called somewhere: `{ place: 'UK', name: 'three-point linkage' }`. */
export type RegionalName = { place: string; name: string }
/** What tells this meaning apart: crops it belongs to, words that stand near it, words that come right before it. */
export type TermContext = { crops?: string[]; near?: string[]; notNear?: string[]; after?: string[] }

/** A glossary entry. */
export class Term extends Model<InferAttributes<Term>, InferCreationAttributes<Term>> {
  declare id: CreationOptional<string>
  declare slug: string
  declare label: string
  declare definition: string
  declare field: string
  declare synonyms: CreationOptional<string[]>
  declare inflections: CreationOptional<string[]>
  declare regional: CreationOptional<RegionalName[]>
  declare context: CreationOptional<TermContext | null>
  declare spanish: CreationOptional<string | null>
  declare agrovoc: CreationOptional<string | null>
  declare sourceNote: CreationOptional<string | null>
  declare explainerId: CreationOptional<string | null>
  declare contentHash: CreationOptional<string | null>
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
}

Term.init(
  {
    id: { type: DataTypes.UUID, allowNull: false, primaryKey: true, defaultValue: DataTypes.UUIDV4 },
    slug: { type: DataTypes.TEXT, allowNull: false },
    label: { type: DataTypes.TEXT, allowNull: false },
    definition: { type: DataTypes.TEXT, allowNull: false },
    field: { type: DataTypes.TEXT, allowNull: false },
    synonyms: { type: DataTypes.ARRAY(DataTypes.TEXT), allowNull: false, defaultValue: [] },
    inflections: { type: DataTypes.ARRAY(DataTypes.TEXT), allowNull: false, defaultValue: [] },
    regional: { type: DataTypes.JSONB, allowNull: false, defaultValue: [] },
    context: { type: DataTypes.JSONB, allowNull: true },
    spanish: { type: DataTypes.TEXT, allowNull: true },
    agrovoc: { type: DataTypes.TEXT, allowNull: true },
    sourceNote: { type: DataTypes.TEXT, allowNull: true },
    explainerId: { type: DataTypes.UUID, allowNull: true },
    contentHash: { type: DataTypes.TEXT, allowNull: true },
    createdAt: { type: DataTypes.DATE, allowNull: false },
    updatedAt: { type: DataTypes.DATE, allowNull: false },
  },
  { sequelize: db(), modelName: 'Term', tableName: 'terms' },
)
