import type { SeedProposal } from './proposalData.ts'

const count = (n: number) => (n === 1 ? 'one target' : `${n} targets`)

/** A justification as authors write it here: headings, formulas, citations, a table. */
export const writtenText = (seed: SeedProposal) => `# The question

${seed.title}: the question is old and the sample is new. Two readings stand in the literature [@vale2024; @ashdown2025], and they part at $z \\simeq ${seed.redshift[0]}$. We measure one quantity in every object, by one method, and say beforehand what each outcome would mean.

# The method

We ask for ${count(seed.targets)} at $${seed.redshift[0]} < z < ${seed.redshift[1]}$. With a flux $F$ measured to a part in ten, the luminosity follows from

$$
L = 4\\pi D_L^2(z)\\,F , \\qquad \\frac{\\sigma_L}{L} = \\sqrt{ \\left(\\frac{\\sigma_F}{F}\\right)^2 + \\left(\\frac{2\\,\\sigma_{D_L}}{D_L}\\right)^2 } .
$$

Where the sky is brighter than the source, the time needed grows as $t \\propto D_L^4$: the farthest target decides the hours.

| what is measured | reading A | reading B |
| --- | ---: | ---: |
| slope with $z$ | $0.0 \\pm 0.1$ | $0.4 \\pm 0.1$ |
| scatter, dex | 0.2 | 0.35 |

# The hours

Each target stands alone: *a part of the time gives a part of the answer*, and no single night decides. The hours follow from the depth needed at the poorest conditions we accept.

# Afterwards

The data are reduced within weeks by an existing pipeline [@pennick2023], and the reduced spectra and images are released with the paper.
`

export const writtenReferences = `@article{vale2024,
  author  = {Vale, Rhosyn and Tormick, Ada},
  title   = {The slope that would not go away},
  journal = {\\apj},
  volume  = 961, pages = {114}, year = 2024
}

@article{ashdown2025,
  author  = {Ashdown, Pell},
  title   = {No slope beyond {$z = 1$}},
  journal = {\\mnras},
  volume  = 537, pages = {2210--2224}, year = 2025
}

@inproceedings{pennick2023,
  author    = {Pennick, Orla and Hask, Jory and Wend, Ilo and Brack, Tam},
  title     = {A pipeline for faint spectra},
  booktitle = {Software for Observatories},
  year      = 2023
}
`

export const writtenTeam = `The team has reduced and published spectra of this kind for ten years. Time given here in call 12, **14 hours**, was observed in full; its results are in print.

- *Lead*: sample, reduction, paper.
- *With*: photometry and the comparison of both readings.
`
