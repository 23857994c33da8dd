export interface DemoAccount {
  /** What the person does, in words for the sign-in page. */
  role: string
  name: string
  email: string
  password: string
}

/** One password for every account of the demonstration; none of them exists in production. */
export const demoPassword = 'night-after-night'

/** The accounts shown on the sign-in page of the demonstration, one for each role. All people are invented. */
export const demoAccounts: readonly DemoAccount[] = [
  {
    role: 'principal investigator',
    name: 'Ilse Marrowby',
    email: 'ilse@tarnhead.example',
    password: demoPassword,
  },
  { role: 'reviewer', name: 'Delphine Ostrake', email: 'delphine@ostbury.example', password: demoPassword },
  { role: 'chair', name: 'Edda Vorskell', email: 'edda@velm.example', password: demoPassword },
  {
    role: 'instrument scientist',
    name: 'Signe Oskeldane',
    email: 'signe@quillonridge.example',
    password: demoPassword,
  },
  { role: 'office', name: 'Maud Ferrisay', email: 'maud@quillonridge.example', password: demoPassword },
]
