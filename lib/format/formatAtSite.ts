import { formatUtcMinute } from './formatUtcMinute'

/** The site's clock, named so that nobody takes it for UTC: `19:00 at the site`. */
export function formatAtSite(at: Date, offsetHours: number): string {
  return `${formatUtcMinute(at, offsetHours)} at the site`
}
