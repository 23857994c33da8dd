'use client'

import { useWatch, type Control } from 'react-hook-form'
import { NumberField } from '@/components/forms/NumberField'
import { SelectField, type SelectOption } from '@/components/forms/SelectField'
import type { ExposureInput } from '@/lib/domain/tools/exposureSchema'
import { PowerLawWords } from '@/components/targets/PowerLawWords'
import { shapes, sources, spectra } from './choices'

/** What is measured and how it lies on the sky; the brightness is left out where it is the answer. */
export function SourceFields({
  control,
  bands,
}: {
  control: Control<ExposureInput>
  bands: readonly SelectOption[]
}) {
  const [solve, source, shape, spectrum] = useWatch({
    control,
    name: ['solve', 'source', 'shape', 'spectrum'],
  })
  const isAnswer = solve === 'limit'
  return (
    <>
      <SelectField name="source" label="What is measured" options={sources} />
      {source === 'line' ? (
        <div className="grid grid-cols-2 gap-4">
          {isAnswer ? null : <NumberField name="flux" label="Flux" unit="erg/s/cm²" width="full" />}
          <NumberField name="wavelength" label="Observed at" unit="Å" />
          <NumberField name="width" label="Intrinsic width" unit="km/s" />
        </div>
      ) : (
        <div className="grid grid-cols-2 gap-4">
          {isAnswer ? null : (
            <NumberField name="magnitude" label={shape === 'uniform' ? 'mag arcsec⁻²' : 'Magnitude'} />
          )}
          <SelectField name="band" label="In the band" options={bands} />
          <SelectField name="spectrum" label="Its spectrum" options={spectra} />
          {spectrum === 'power-law' ? <NumberField name="index" label={<PowerLawWords />} /> : null}
          {spectrum === 'black-body' ? (
            <>
              <NumberField name="temperature" label="Temperature" unit="K" />
              <NumberField name="redshift" label="At redshift" />
            </>
          ) : null}
        </div>
      )}
      <SelectField name="shape" label="It looks like" options={shapes} />
      {shape === 'galaxy' ? (
        <div className="grid grid-cols-2 gap-4">
          <NumberField name="radius" label="Half-light radius" unit="″" />
          <NumberField name="sersic" label="Sérsic index" />
        </div>
      ) : null}
      {shape === 'uniform' ? <NumberField name="area" label="Summed over" unit="arcsec²" /> : null}
    </>
  )
}
