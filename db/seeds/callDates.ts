const day = 24 * 3600 * 1000

export interface SeedCallDates {
  season_from: string
  season_to: string
  opens_at: Date
  closes_at: Date
  grace_until: Date
  assessments_due_at: Date
  reviews_due_at: Date
  panel_meets_at: Date
  letters_at: Date
}

const isoDay = (date: Date) => date.toISOString().slice(0, 10)

function monthStart(date: Date, monthsAhead: number): Date {
  return new Date(Date.UTC(date.getUTCFullYear(), date.getUTCMonth() + monthsAhead, 1))
}

function at(anchor: Date, days: number, hour: number): Date {
  const midnight = Date.UTC(anchor.getUTCFullYear(), anchor.getUTCMonth(), anchor.getUTCDate())
  return new Date(midnight + days * day + hour * 3_600_000)
}

function dates(anchor: Date, closesIn: number, seasonStart: Date): SeedCallDates {
  return {
    season_from: isoDay(seasonStart),
    season_to: isoDay(new Date(monthStart(seasonStart, 6).getTime() - day)),
    opens_at: at(anchor, closesIn - 58, 12),
    closes_at: at(anchor, closesIn, 22),
    grace_until: at(anchor, closesIn + 14, 22),
    assessments_due_at: at(anchor, closesIn + 14, 22),
    reviews_due_at: at(anchor, closesIn + 37, 22),
    panel_meets_at: at(anchor, closesIn + 43, 13),
    letters_at: at(anchor, closesIn + 57, 15),
  }
}

/** Dates of the calls around the day the demonstration is first started. Seasons follow one another. */
export function callDates(anchor: Date): {
  earlier: SeedCallDates
  decided: SeedCallDates
  inReview: SeedCallDates
  open: SeedCallDates
} {
  const closesInReview = -30
  const reviewSeason = monthStart(at(anchor, closesInReview + 75, 0), 1)
  return {
    earlier: dates(anchor, -397, monthStart(reviewSeason, -12)),
    decided: dates(anchor, -214, monthStart(reviewSeason, -6)),
    inReview: dates(anchor, closesInReview, reviewSeason),
    open: dates(anchor, 14, monthStart(reviewSeason, 6)),
  }
}
