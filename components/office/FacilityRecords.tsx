import { ModesTable } from '@/components/calls/ModesTable'
import { Facts } from '@/components/ui/Facts'
import { SectionHeading } from '@/components/ui/SectionHeading'
import type { FacilityView } from '@/lib/domain/facility/types'
import { formatNumber, formatOffset, formatPercent, formatQuantity, formatSigned } from '@/lib/format'

const byBand = (values: Record<string, number>, decimals: number) =>
  Object.entries(values)
    .map(([band, value]) => `${band}\u00a0${formatNumber(value, decimals)}`)
    .join(', ')

/** Sites, telescopes, instruments and modes as they are computed with. */
export function FacilityRecords({ facility }: { facility: FacilityView }) {
  const instruments = [...new Set(facility.modes.map((mode) => mode.instrument.name))]
  return (
    <>
      {facility.sites.map((site) => (
        <section key={site.siteId} className="mt-10">
          <SectionHeading title={site.name} aside={`record ${site.recordVersion}`} />
          <div className="mt-4 grid gap-x-16 md:grid-cols-2">
            <Facts
              facts={[
                { term: 'Latitude, north positive', value: `${formatSigned(site.latitudeDeg, 4)}°` },
                { term: 'Longitude, east positive', value: `${formatSigned(site.longitudeDeg, 4)}°` },
                { term: 'Height', value: formatQuantity(site.elevationM, 0, 'm') },
                { term: 'Clock at the site', value: formatOffset(site.utcOffsetHours) },
                { term: 'Lowest altitude', value: `${formatNumber(site.lowestAltitudeDeg, 0)}°` },
              ]}
            />
            <Facts
              facts={[
                {
                  term: 'Image quality at zenith, best tenth, median, poorest tenth',
                  value: `${[site.seeingArcsec.best10, site.seeingArcsec.median, site.seeingArcsec.worst90].map((v) => `${formatNumber(v, 1)}″`).join(', ')}`,
                },
                { term: 'Extinction, mag an airmass', value: byBand(site.extinctionMagPerAirmass, 2) },
                { term: 'Dark sky, AB mag arcsec⁻²', value: byBand(site.darkSkyMagArcsec2, 1) },
              ]}
            />
          </div>
        </section>
      ))}
      <section className="mt-12">
        <SectionHeading title="Instrument modes" />
        <div className="mt-4">
          <ModesTable modes={facility.modes} />
        </div>
      </section>
      {instruments.map((name) => (
        <section key={name} className="mt-10">
          <SectionHeading title={name} />
          <div className="mt-3 grid gap-x-16 gap-y-6 md:grid-cols-2">
            {facility.modes
              .filter((mode) => mode.instrument.name === name)
              .map((mode) => (
                <Facts
                  key={mode.slug}
                  title={mode.name}
                  facts={[
                    {
                      term: 'Efficiency',
                      value: mode.throughput
                        .map(
                          (row) =>
                            `${formatPercent(row.efficiency, 0)} at ${formatQuantity(row.wavelengthA, 0, 'Å')}`,
                        )
                        .join(', '),
                    },
                    { term: 'It includes', value: mode.throughputIncludes.join(', ') },
                    {
                      term: 'Overheads: acquisition, read-out, dither',
                      value: `${formatQuantity(mode.overheads.acquisitionS, 0, 's')}, ${formatQuantity(mode.overheads.readoutS, 0, 's')}, ${formatQuantity(mode.overheads.ditherS, 0, 's')}`,
                    },
                    {
                      term: 'Record',
                      value: `${mode.recordVersion}; telescope ${mode.telescope.recordVersion}`,
                    },
                  ]}
                />
              ))}
          </div>
        </section>
      ))}
    </>
  )
}
