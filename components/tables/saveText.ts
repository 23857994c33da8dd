/** Offers a text made in the browser as a file to keep. */
export function saveText(fileName: string, text: string, type = 'text/csv;charset=utf-8'): void {
  const address = URL.createObjectURL(new Blob([text], { type }))
  const anchor = document.createElement('a')
  anchor.href = address
  anchor.download = fileName
  anchor.click()
  URL.revokeObjectURL(address)
}
