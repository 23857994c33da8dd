/** What stands where nothing can mend a difference but people. */
export const forPeople = 'for the office to clear'
