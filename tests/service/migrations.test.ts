import { execFileSync } from 'node:child_process'
import { QueryTypes } from 'sequelize'
import { describe, expect, it } from 'vitest'
import { db } from '@/lib/db'
import { freshDatabase } from '../support/database'

freshDatabase()

const run = (said: string) =>
  execFileSync(process.execPath, ['--import', 'tsx', 'scripts/migrate.ts', said], {
    encoding: 'utf8',
    env: process.env,
  })

const columns = () =>
  db().query(
    `select table_name, column_name, data_type, is_nullable, column_default from information_schema.columns
     where table_schema = 'public' order by 1, 2`,
    { type: QueryTypes.SELECT },
  )

describe('the migrations', () => {
  it('go down to nothing and come up again to the same tables', async () => {
    const before = await columns()
    expect(before.length).toBeGreaterThan(100)
    run('down')
    const left = (await columns()) as { table_name: string }[]
    expect(new Set(left.map(({ table_name }) => table_name))).toEqual(new Set(['migrations']))
    run('up')
    expect(await columns()).toEqual(before)
    expect(run('pending').trim()).toBe('')
  })

  it('index every column that points to another table', async () => {
    const bare = await db().query(
      `select c.conrelid::regclass::text as "table", a.attname as "column"
       from pg_constraint c join pg_attribute a on a.attrelid = c.conrelid and a.attnum = c.conkey[1]
       where c.contype = 'f' and c.connamespace = 'public'::regnamespace
         and not exists (select 1 from pg_index i where i.indrelid = c.conrelid and i.indkey[0] = c.conkey[1])`,
      { type: QueryTypes.SELECT },
    )
    expect(bare).toEqual([])
  })
})
