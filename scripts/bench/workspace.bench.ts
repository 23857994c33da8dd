import type { ProposalContents } from '../../lib/domain/proposals/types'
import { computeProposal } from '../../lib/domain/observations/computeProposal'
import { makePacket } from '../../lib/domain/packets/makePacket'
import { readTargetFile, rowsOf } from '../../lib/domain/targets/rules'
import { contents, observation, target } from '../../tests/support/contents'
import { pdfWith } from '../../tests/support/pdfs'
import { sayTime } from './measure'
import { reportText } from './report'

/** Processor time since, so that a busy machine does not matter. */
function spent(since: NodeJS.CpuUsage): string {
  const { user, system } = process.cpuUsage(since)
  return sayTime((user + system) / 1e6)
}

const ROWS = 5000
/** Two rows in three of which something cannot be read: minutes past 59, a word for a number, a name left out. */
const lines = Array.from({ length: ROWS }, (_, i) => {
  const dec = i % 3 === 1 ? '-12:75:00' : `-${10 + (i % 60)}:20:30.5`
  return `${i % 9 === 2 ? '' : `QX ${i}`},${(i * 0.07) % 360},${dec},${i % 3 === 2 ? 'high' : 0.1 + i / 2000},19.${i % 10}`
})
const text = ['name,ra,dec,redshift,r', ...lines].join('\n')
const begun = process.cpuUsage()
const file = readTargetFile(text)
if (!file.ok) throw new Error(file.message)
const rows = rowsOf(file.table, file.mapping)
const wrong = rows.filter(({ errors }) => Object.keys(errors).length > 0).length
reportText(
  `a file of ${ROWS.toLocaleString('en')} targets read, ${wrong.toLocaleString('en')} rows with errors`,
  spent(begun),
  'asked for: below 2 s',
)

const PAGES = 8
const targets = Array.from({ length: 20 }, (_, i) =>
  target({ id: i + 1, name: `QX ${i}`, raDeg: (i * 37) % 360, decDeg: -70 + i, redshift: 0.05 + i / 400 }),
)
const whole: ProposalContents = contents({
  targets,
  observations: targets.map(({ id }) => observation({ id: 100 + id, targetId: id })),
})
const computation = computeProposal(whole)
const paper = await pdfWith(Array.from({ length: PAGES }, (_, i) => `Justification, sheet ${i + 1}`))

async function packet(title: string): Promise<string> {
  const snapshot = { contents: { ...whole, title }, computation, engineVersion: computation.engineVersion }
  const input = { snapshot, variant: 'anonymised', versionNumber: 1, paperSha256: 'f'.repeat(64) } as const
  const start = process.cpuUsage()
  const { pages } = await makePacket(input, { paper, pictures: new Map() })
  return `${spent(start)} for ${pages} pages`
}

const first = await packet('The first')
reportText('a packet drawn, fonts read for it', first, 'asked for: 10 pages below 3 s')
reportText('the next packet', await packet('The next'), 'asked for: 10 pages below 3 s')
