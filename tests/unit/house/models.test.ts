import { readdirSync, readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'

const files = readdirSync('models').filter((file) => file !== 'associations.ts')

describe('a model', () => {
  // A build renames every class to one letter, and Sequelize tells models apart by name.
  it.each(files)('%s says its own name, because a build takes the class’s', (file) => {
    const text = readFileSync(`models/${file}`, 'utf8')
    const name = /export class (\w+) extends Model/.exec(text)?.[1]
    expect(text).toContain(`modelName: '${name}'`)
  })
})
