import { SignEntry } from './SignEntry'

/** What the words at the right of the request strip mean. */
export function SavingExplained() {
  return (
    <>
      <SignEntry sign="Saving …">On its way. You may go on typing.</SignEntry>
      <SignEntry sign="Saved 02:14:05 UTC">Kept by the observatory, by its own clock.</SignEntry>
      <SignEntry sign={<strong className="font-semibold text-lamp">Offline: kept in this browser</strong>}>
        There is no network. It is sent when the network is back; until then do not change browsers.
      </SignEntry>
      <SignEntry
        sign={<strong className="font-semibold text-not-feasible">Not saved. Trying again in 5 s</strong>}
      >
        The observatory did not take it. It is tried again, ever more slowly, while the page stays open.
      </SignEntry>
      <SignEntry sign="theirs, yours">
        A co-investigator changed the same thing first. You see both versions and keep one; nothing is
        overwritten unseen.
      </SignEntry>
    </>
  )
}
