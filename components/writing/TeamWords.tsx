import { BarNote } from '@/components/ui/BarNote'
import { SectionHeading } from '@/components/ui/SectionHeading'
import type { Writing } from '@/lib/domain/proposals/writingTypes'
import { maxTeamWords } from '@/lib/domain/writings/limits'
import { formatNumber } from '@/lib/format'
import { TextForm, type SaveWriting } from './TextForm'
import { Written } from './Written'

export interface TeamWordsProps {
  reference: string
  kept: Writing
  isDocument: boolean
  /** Null for those who only look. */
  save: SaveWriting | null
}

/** Who asks, and what they made of time given before: read by the panel once its ranking is frozen. */
export function TeamWords({ reference, kept, isDocument, save }: TeamWordsProps) {
  return (
    <section className="mb-10">
      <SectionHeading
        dense
        title="On the team (optional)"
        aside={`at most ${formatNumber(maxTeamWords)} words; the panel reads it after its ranking is frozen`}
      />
      {isDocument ? (
        <div className="mt-3 max-w-prose">
          <BarNote tone="lamp">
            <p className="m-0">A PDF stands below in the place of these words. They are kept.</p>
          </BarNote>
        </div>
      ) : null}
      <div className="mt-4">
        {save ? (
          <TextForm
            reference={reference}
            part="team"
            kept={kept}
            wordLimit={maxTeamWords}
            label="Who you are, and time you had before"
            help="Names are welcome here: who does what, and what came of time at this observatory in earlier calls."
            save={save}
          />
        ) : kept.text ? (
          <div className="max-w-prose">
            <Written text={kept.text} />
          </div>
        ) : (
          <p className="m-0 text-muted">Nothing is written here.</p>
        )}
      </div>
    </section>
  )
}
