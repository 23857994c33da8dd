/** Where the office of the observatory is written to. */
export const officeAddress = 'office@quillonridge.example'

/** Where an institute pays an invoice to, as printed on it. The demonstration's account does not exist. */
export const officeBank = 'Quillon Ridge Observatory, account 4470 1182 0093 (demonstration: no such account)'
