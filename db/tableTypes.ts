import type { Database } from './client.ts'

interface ColumnRow {
  TABLE_NAME: string
  COLUMN_NAME: string
  COLUMN_TYPE: string
  DATA_TYPE: string
  IS_NULLABLE: 'YES' | 'NO'
  COLUMN_DEFAULT: string | null
  EXTRA: string
}

const outside = new Set(['migrations', 'migrations_lock'])

const pascal = (name: string) =>
  name.replace(/(^|_)([a-z0-9])/g, (_, __, letter: string) => letter.toUpperCase())

function typeOf(column: ColumnRow): string {
  if (column.COLUMN_TYPE === 'tinyint(1)') return '0 | 1'
  switch (column.DATA_TYPE) {
    case 'enum':
      return column.COLUMN_TYPE.slice(5, -1).split(',').join(' | ')
    case 'int':
    case 'double':
      return 'number'
    case 'datetime':
      return 'Date'
    default:
      // DECIMAL, DATE and JSON arrive as text, so that nothing is rounded on the way.
      return 'string'
  }
}

/** Row types of the live schema as TypeScript source: what db/tables.ts must say. */
export async function tableTypes(db: Database): Promise<string> {
  const [rows] = (await db.raw(
    `SELECT TABLE_NAME, COLUMN_NAME, COLUMN_TYPE, DATA_TYPE, IS_NULLABLE, COLUMN_DEFAULT, EXTRA
       FROM information_schema.COLUMNS WHERE TABLE_SCHEMA = DATABASE() ORDER BY TABLE_NAME, ORDINAL_POSITION`,
  )) as [ColumnRow[]]
  const tables = [...new Set(rows.map((row) => row.TABLE_NAME))].filter((name) => !outside.has(name))

  const interfaces = tables.map((table) => {
    const columns = rows.filter((row) => row.TABLE_NAME === table)
    const fields = columns.map(
      (column) =>
        `  ${column.COLUMN_NAME}: ${typeOf(column)}${column.IS_NULLABLE === 'YES' ? ' | null' : ''}`,
    )
    const optional = columns
      .filter(
        (c) => c.IS_NULLABLE === 'YES' || c.COLUMN_DEFAULT !== null || c.EXTRA.includes('auto_increment'),
      )
      .map((c) => `'${c.COLUMN_NAME}'`)
    return {
      source: `export interface ${pascal(table)}Row {\n${fields.join('\n')}\n}`,
      entry: `    ${table}: Knex.CompositeTableType<${pascal(table)}Row, Insert<${pascal(table)}Row, ${optional.join(' | ') || 'never'}>>`,
    }
  })

  return `// Made by \`npm run db:types\` from the migrated schema; a test fails when the two differ.
import type { Knex } from 'knex'

type Insert<Row, Optional extends keyof Row> = Omit<Row, Optional> & Partial<Pick<Row, Optional>>

${interfaces.map((i) => i.source).join('\n\n')}

declare module 'knex/types/tables.js' {
  interface Tables {
${interfaces.map((i) => i.entry).join('\n')}
  }
}
`
}
