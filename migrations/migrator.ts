import type { Sequelize } from 'sequelize'
import { SequelizeStorage, Umzug, type MigrationFn } from 'umzug'

/** `run` takes one or more plain SQL statements. */
export type Hands = { run: (sql: string) => Promise<unknown> }
export type Migration = MigrationFn<Hands>

const ONE_AT_A_TIME = 727_001

function umzugFor(sequelize: Sequelize) {
  return new Umzug<Hands>({
    migrations: { glob: ['migrations/2*.ts', { cwd: process.cwd() }] },
    // Each migration is one transaction: half a migration never stays behind.
    context: { run: (sql) => sequelize.transaction((transaction) => sequelize.query(sql, { transaction })) },
    storage: new SequelizeStorage({ sequelize, tableName: 'migrations' }),
    logger: undefined,
  })
}

async function alone<T>(sequelize: Sequelize, work: () => Promise<T>): Promise<T> {
  // umzug has no lock of its own; two starts at once would both see the same migration pending.
  return sequelize.transaction(async (transaction) => {
    await sequelize.query(`select pg_advisory_xact_lock(${ONE_AT_A_TIME})`, { transaction })
    return work()
  })
}

/** Brings the schema up to date. Returns the names that were run. Needs a pool of at least two connections. */
export const migrateUp = (sequelize: Sequelize): Promise<string[]> =>
  alone(sequelize, async () => (await umzugFor(sequelize).up()).map(({ name }) => name))

/** Takes every migration back, newest first. For tests of `down` and for leaving; it deletes all data. */
export const migrateDown = (sequelize: Sequelize): Promise<string[]> =>
  alone(sequelize, async () => (await umzugFor(sequelize).down({ to: 0 })).map(({ name }) => name))

export const pendingMigrations = async (sequelize: Sequelize): Promise<string[]> =>
  (await umzugFor(sequelize).pending()).map(({ name }) => name)
