import { BarNote } from '@/components/ui/BarNote'
import { refusedVariance } from '@/lib/domain/tools/yardstick/refusedVariance'
import type { AskedSurvey } from '@/lib/domain/tools/yardstick/surveyFields'

/** What the counts of a survey rest on, and why clustering is not known where it is not. */
export function SurveyNotes({ survey, redshifts }: { survey: AskedSurvey; redshifts: readonly number[] }) {
  const refused = refusedVariance(survey, redshifts)
  return (
    <section className="mt-8 max-w-prose">
      <h2 className="text-section">What the counts rest on</h2>
      <p className="mt-1">
        N = n V, with √N of counting. Galaxies cluster, so that one field differs from another by σ N more, σ
        = b(m, z) σ<sub>dm</sub>(z) after Moster et al. 2011 (ApJ 731, 113). Their fields are 3.3′ to 84′
        wide; between them σ is taken as a power of the area. It is the same under every cosmology here, and
        good to some tens of percent.
      </p>
      {refused ? (
        <div className="mt-4">
          <BarNote tone="marginal">{refused}</BarNote>
        </div>
      ) : null}
    </section>
  )
}
