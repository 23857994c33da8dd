/** Invented institutes and people of the demonstration. */
export const institutes = [
  { name: 'Quillon Ridge Observatory', affiliation_class: 'member' },
  { name: 'Tarnhead University', affiliation_class: 'member' },
  { name: 'Ostbury College', affiliation_class: 'member' },
  { name: 'Velm Technical University', affiliation_class: 'member' },
  { name: 'Institute for Deep Fields, Corravale', affiliation_class: 'partner' },
  { name: 'Maresk School of Astronomy', affiliation_class: 'partner' },
  { name: 'Lindmoor Observatory', affiliation_class: 'other' },
  { name: 'University of Sandrey', affiliation_class: 'other' },
  { name: 'Harrowgate Institute of Physics', affiliation_class: 'other' },
  { name: 'Pellworm Academy of Sciences', affiliation_class: 'other' },
] as const

export interface SeedPerson {
  name: string
  email: string
  institute: (typeof institutes)[number]['name']
  stage: 'student' | 'postdoc' | 'staff'
}

const at = (
  institute: SeedPerson['institute'],
  domain: string,
  ...people: [name: string, stage: SeedPerson['stage']][]
): SeedPerson[] =>
  people.map(([name, stage]) => ({
    name,
    stage,
    institute,
    email: `${(name.split(' ')[0] ?? name)
      .normalize('NFD')
      .replace(/[^A-Za-z]/g, '')
      .toLowerCase()}@${domain}.example`,
  }))

export const staff: readonly SeedPerson[] = at(
  'Quillon Ridge Observatory',
  'quillonridge',
  ['Maud Ferrisay', 'staff'],
  ['Signe Oskeldane', 'staff'],
  ['Piers Haldrick', 'staff'],
  ['Noor Velasquine', 'staff'],
)

/** The panel: chair and deputy first, then members. */
export const panel: readonly SeedPerson[] = [
  ...at(
    'Velm Technical University',
    'velm',
    ['Edda Vorskell', 'staff'],
    ['Joren Blackmarsh', 'staff'],
    ['Ayla Stroud', 'postdoc'],
  ),
  ...at(
    'Institute for Deep Fields, Corravale',
    'corravale',
    ['Corin Thessaly', 'staff'],
    ['Mirela Fontane', 'staff'],
  ),
  ...at(
    'Ostbury College',
    'ostbury',
    ['Delphine Ostrake', 'staff'],
    ['Rasmus Ekholt', 'staff'],
    ['Ines Caldwyn', 'postdoc'],
  ),
  ...at('Maresk School of Astronomy', 'maresk', ['Tobin Aldersey', 'staff'], ['Yuna Parrish', 'staff']),
  ...at('Lindmoor Observatory', 'lindmoor', ['Hedda Brandvik', 'staff'], ['Oskar Delmain', 'postdoc']),
  ...at('University of Sandrey', 'sandrey', ['Priya Valmont', 'staff'], ['Leander Moss', 'staff']),
]

export const investigators: readonly SeedPerson[] = [
  ...at(
    'Tarnhead University',
    'tarnhead',
    ['Ilse Marrowby', 'staff'],
    ['Tomas Quenhart', 'postdoc'],
    ['Sefa Lindqvane', 'student'],
    ['Oda Kestrelsen', 'staff'],
    ['Rhea Aldanmarsh', 'postdoc'],
  ),
  ...at(
    'Harrowgate Institute of Physics',
    'harrowgate',
    ['Wanru Ostrelle', 'staff'],
    ['Pavo Linzmoor', 'staff'],
    ['Sten Abernorth', 'postdoc'],
    ['Tiwa Oyelmere', 'staff'],
  ),
  ...at(
    'Pellworm Academy of Sciences',
    'pellworm',
    ['Ulla Brandvoss', 'staff'],
    ['Viggo Castermole', 'staff'],
    ['Wren Ashdowry', 'student'],
    ['Xenia Dolmareff', 'staff'],
  ),
  ...at(
    'University of Sandrey',
    'sandrey',
    ['Yusra Falkenay', 'postdoc'],
    ['Zeno Harbindel', 'staff'],
    ['Agda Morrowin', 'staff'],
  ),
  ...at(
    'Lindmoor Observatory',
    'lindmoor',
    ['Bo Trevanskild', 'staff'],
    ['Cleo Umberfane', 'postdoc'],
    ['Dario Vextmoor', 'staff'],
  ),
  ...at(
    'Maresk School of Astronomy',
    'maresk',
    ['Elva Quillhurst', 'staff'],
    ['Finn Odderby', 'student'],
    ['Gaia Pennorth', 'staff'],
    ['Hugo Rastwick', 'staff'],
  ),
  ...at(
    'Institute for Deep Fields, Corravale',
    'corravale',
    ['Inês Solvarde', 'staff'],
    ['Jai Tamberlyn', 'postdoc'],
    ['Kirsi Undelow', 'staff'],
    ['Leif Warrendale', 'staff'],
  ),
]
