import { ComputedNumber } from '@/components/ui/ComputedNumber'
import { formatPercent, formatQuantity, formatNumber } from '@/lib/format'
import { cosmologyEngineVersion, presetCosmology } from '@/lib/science/cosmology'

const z = 1.29

/** One computed number to open: the proper scale at z = 1.290. */
export function ScaleNumber() {
  const planck = presetCosmology('planck-2018')
  const ladder = presetCosmology('local-ladder')
  const scale = planck.kpcPerArcsec(z)
  const other = ladder.kpcPerArcsec(z)
  return (
    <ComputedNumber
      shown={formatNumber(scale, 3)}
      value={formatQuantity(scale, 3, 'kpc/″')}
      what={`proper scale at z = ${formatNumber(z, 3)}`}
      formula={
        <>
          s = D<sub>A</sub> · π / 648,000
        </>
      }
      inputs={[
        { term: 'z', value: formatNumber(z, 3) },
        {
          term: (
            <>
              D<sub>A</sub>
            </>
          ),
          value: formatQuantity(planck.angularDiameterMpc(z), 3, 'Mpc'),
        },
        { term: 'Cosmology', value: planck.parameters.name },
      ]}
      second={{
        term: `Under ${ladder.parameters.name}`,
        value: formatQuantity(other, 3, 'kpc/″'),
        difference: formatPercent(other / scale - 1, 1),
      }}
      source={`Hogg 1999, eq. 18. Engine ${cosmologyEngineVersion}.`}
    />
  )
}
