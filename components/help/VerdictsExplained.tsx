import { VerdictMark } from '@/components/ui/VerdictMark'
import { SignEntry } from './SignEntry'

/** The bar against its limit, and the two sets of words that share it. */
export function VerdictsExplained() {
  return (
    <>
      <p className="mb-3 max-w-prose text-table text-muted">
        A bar stands against a limit. Its word always stands beside it, so the colour may be ignored.
      </p>
      <SignEntry sign={<VerdictMark verdict="feasible" />}>Clear of the limit.</SignEntry>
      <SignEntry sign={<VerdictMark verdict="marginal" />}>
        Just over it: between the limit for feasible and the limit where it fails. Each check has its own two.
      </SignEntry>
      <SignEntry sign={<VerdictMark verdict="not-feasible" />}>
        Well past it. The check says what would fix it.
      </SignEntry>
      <p className="my-3 max-w-prose text-table text-muted">
        A whole proposal is as good as the worst of its required targets, and of its groups by their rules: of
        five targets of which three are wanted, the third best counts. Backups and optional targets do not
        sink it.
      </p>
      <SignEntry
        sign={
          <span className="flex flex-col gap-1">
            <VerdictMark verdict="accepted" />
            <VerdictMark verdict="change" />
            <VerdictMark verdict="not-possible" />
          </span>
        }
      >
        The same three in an instrument scientist’s assessment. It stands above the computed verdict, in both
        directions, with a reason; the computed one stays beside it.
      </SignEntry>
    </>
  )
}
