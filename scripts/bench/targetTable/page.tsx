import { NuqsAdapter } from 'nuqs/adapters/react'
import { createRoot } from 'react-dom/client'
import '@/app/globals.css'
import { TargetsEditor } from '@/components/targets/TargetsEditor'
import type { TargetActions } from '@/components/targets/targetActions'
import { computeProposal } from '@/lib/domain/observations/rules'
import { targetRowSchema } from '@/lib/domain/targets/schema'
import { contents as sample, observation, target } from '../../../tests/support/contents'

const ROWS = 500

/** The page of targets as an investigator sees it, five hundred of them, every one observed. */
const targets = Array.from({ length: ROWS }, (_, i) =>
  target({
    ...{ id: i + 1, position: i + 1, name: `QX ${i + 1}` },
    ...{ raDeg: (i * 37) % 360, decDeg: -70 + (i % 80), redshift: 0.05 + i / 400 },
    ...{
      raTyped: String((i * 37) % 360),
      decTyped: String(-70 + (i % 80)),
      redshiftTyped: String(0.05 + i / 400),
    },
  }),
)
const contents = {
  ...sample(),
  targets,
  observations: targets.map(({ id }) => observation({ id: 1000 + id, targetId: id })),
}
const no = async () => ({ ok: false as const, kind: 'invalid' as const, message: 'No.', fieldErrors: {} })
const save: TargetActions['save'] = async ({ id, version, row }) => ({
  ok: true,
  data: { ...targetRowSchema.parse(row), id, position: id, version: version + 1 },
})
const rest = { add: no, change: no, remove: no, restore: no, reorder: no, importRows: no, ask: no }

createRoot(document.getElementById('page') ?? document.body).render(
  <NuqsAdapter>
    <TargetsEditor
      contents={contents}
      computation={computeProposal(contents)}
      readOnly={null}
      actions={{ ...rest, saveGroup: no, removeGroup: no, save }}
    />
  </NuqsAdapter>,
)
