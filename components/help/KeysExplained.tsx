import { Facts } from '@/components/ui/Facts'

/** What the keyboard does everywhere. */
export function KeysExplained() {
  return (
    <div className="max-w-prose">
      <Facts
        facts={[
          { term: 'Tab, first press on a page', value: 'a link that skips to the page itself' },
          { term: 'Enter or Space on a head of a table', value: 'sorts by it; again turns the order' },
          { term: 'Enter on a computed number', value: 'opens its formula, inputs and source' },
          { term: 'Arrows on a plot', value: 'read values along it' },
          { term: 'Arrows, Home, End, digits on a score', value: 'set it in halves' },
          { term: 'Escape', value: 'closes what floats and gives the focus back' },
          { term: 'F8', value: 'moves to the latest notice' },
        ]}
      />
    </div>
  )
}
