/** Where the office of the observatory is written to. */
export const officeAddress = 'office@quillonridge.example'
