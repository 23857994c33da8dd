const names: Readonly<Record<string, string>> = {
  student: 'Students',
  postdoc: 'Postdocs',
  staff: 'Staff',
  emeritus: 'Emeriti',
  other: 'Others',
}

/** Career stages in words, for counts. */
export const stageName = (stage: string | null): string => names[stage ?? ''] ?? 'Not said'
