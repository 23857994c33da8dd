'use client'

import { useState } from 'react'
import { ScoreRuler } from '@/components/forms/ScoreRuler'

/** The score ruler to try; nothing is kept. */
export function RulerPractice() {
  const [score, setScore] = useState<number | null>(7.5)
  return (
    <div className="max-w-[404px]">
      <ScoreRuler
        label="Will this answer it"
        counts="counts 3 of 10"
        help="Try it: drag, arrow keys, Home, End, or digits."
        value={score}
        onChange={setScore}
      />
    </div>
  )
}
