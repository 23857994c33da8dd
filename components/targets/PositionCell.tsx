'use client'

import { useFormContext, useWatch } from 'react-hook-form'
import { ReadBack } from '@/components/ui/ReadBack'
import { formatNumber } from '@/lib/format'
import { parseDeclination, parseRightAscension } from '@/lib/science/sky/coordinates'
import { splitPosition } from '@/lib/domain/targets/rules'
import type { TargetRow } from '@/lib/domain/targets/schema'
import { TypedCell } from '@/components/rows/TypedCell'

export interface PositionCellProps {
  name: string
  row: number
  readOnly: boolean
  messageId: string
  /** Takes a block of cells pasted into one half; false when it is none. */
  onPasteBlock: (at: 'ra' | 'dec', text: string) => boolean
}

/** Right ascension and declination as typed, and the degrees they were understood as. */
export function PositionCell({ name, row, readOnly, messageId, onPasteBlock }: PositionCellProps) {
  const { control, setValue } = useFormContext<TargetRow>()
  const [ra = '', dec = '', event = ''] = useWatch({ control, name: ['ra', 'dec', 'event'] })
  const isAwaited = event !== ''
  const read = { ra: parseRightAscension(ra), dec: parseDeclination(dec) }

  // A whole position pasted into either half fills both.
  const paste = (at: 'ra' | 'dec') => (text: string) => {
    if (onPasteBlock(at, text)) return true
    const halves = splitPosition(text)
    if (!halves || readOnly) return false
    setValue('ra', halves.ra, { shouldDirty: true })
    setValue('dec', halves.dec, { shouldDirty: true, shouldValidate: true })
    return true
  }
  const shared = { row, readOnly, messageId }
  return (
    <>
      <span className="flex gap-2">
        <TypedCell
          {...shared}
          name="ra"
          onPasteText={paste('ra')}
          label={`Right ascension of ${name}`}
          placeholder={isAwaited ? 'none yet' : 'h m s or degrees'}
        />
        <TypedCell
          {...shared}
          name="dec"
          onPasteText={paste('dec')}
          label={`Declination of ${name}`}
          placeholder={isAwaited ? 'none yet' : '± d m s'}
        />
      </span>
      {read.ra.ok && read.dec.ok ? (
        <ReadBack>
          <span className="text-tick text-muted">
            {formatNumber(read.ra.deg, 5)}° {formatNumber(read.dec.deg, 5)}°
          </span>
        </ReadBack>
      ) : null}
    </>
  )
}
