'use client'

import { NumberField } from '@/components/forms/NumberField'
import { TextField } from '@/components/forms/TextField'
import { SectionHeading } from '@/components/ui/SectionHeading'
import type { SiteTyped } from '@/lib/domain/facility/siteForm'
import { RecordTable } from './RecordTable'

const three = 'grid gap-x-8 gap-y-6 sm:grid-cols-2 lg:grid-cols-3'

export interface SiteFieldsProps {
  /** What the newest record says; empty tables for a new site. */
  before: Pick<SiteTyped, 'horizon' | 'extinction' | 'darkSky'>
  /** Its tables are kept in files of this name. */
  fileName: string
}

/** What a record of a site says: place, horizon, weather, air and sky. */
export function SiteFields({ before, fileName }: SiteFieldsProps) {
  return (
    <>
      <SectionHeading title="Where it stands" dense />
      <div className={three}>
        <NumberField name="latitudeDeg" label="Latitude" help="North positive." unit="°" />
        <NumberField name="longitudeDeg" label="Longitude" help="East positive." unit="°" />
        <NumberField name="elevationM" label="Height" help="Above the sea." unit="m" />
        <NumberField
          name="lowestAltitudeDeg"
          label="Lowest altitude"
          help="Telescopes point no lower. True altitude, without refraction."
          unit="°"
        />
        <TextField name="timeZone" label="Time zone" help="By its IANA name." width="medium" />
        <NumberField
          name="utcOffsetHours"
          label="Offset from UTC"
          help="The clock at the site, all year."
          unit="h"
        />
      </div>
      <SectionHeading title="Horizon" dense />
      <RecordTable
        name="horizon"
        kind="horizon"
        label="Lowest altitude by azimuth"
        help="From north through east, straight between the rows and on from the last to the first. No rows: level at the lowest altitude. True altitudes; at 20° refraction lifts a source by 0.05°."
        before={before.horizon}
        fileName={`${fileName}-horizon`}
      />
      <SectionHeading title="Image quality at the zenith and 500 nm" dense />
      <div className={three}>
        <NumberField name="best10" label="Best tenth of nights" unit="″" />
        <NumberField name="median" label="Median" unit="″" />
        <NumberField name="worst90" label="Poorest tenth of nights" unit="″" />
      </div>
      <SectionHeading title="Weather" dense />
      <div className="grid gap-x-8 gap-y-6 lg:grid-cols-[2fr_1fr]">
        <TextField
          name="lostByMonth"
          label="Nights lost, January to December"
          help="Twelve numbers with commas between. Left empty, no weather is allowed for."
          unit="%"
          optional
          maxLength={200}
        />
        <NumberField
          name="persistence"
          label="Correlation of neighbouring nights"
          help="0 where a night tells nothing of the next."
          optional
        />
      </div>
      <SectionHeading title="The air and the sky, band by band" dense />
      <RecordTable
        name="extinction"
        kind="extinction"
        label="Extinction"
        help="Magnitudes an airmass; between bands the nearest counts."
        before={before.extinction}
        fileName={`${fileName}-extinction`}
      />
      <RecordTable
        name="darkSky"
        kind="dark-sky"
        label="Dark sky"
        help="At the zenith without a Moon, AB magnitudes a square arcsecond."
        before={before.darkSky}
        fileName={`${fileName}-dark-sky`}
      />
    </>
  )
}
