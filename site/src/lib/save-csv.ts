/** Cells as CSV. A text that a spreadsheet would take for a formula is made harmless. */
export const csvOf = async (cells: readonly (readonly string[])[]): Promise<string> => {
  const { default: Papa } = await import('papaparse')
  // Numbers keep their sign; only what is no number is guarded.
  return Papa.unparse(cells as string[][], { escapeFormulae: /^[=@\t\r]|^[+-](?![\d.])/ })
}

/** Saves cells as a CSV file. */
export const saveCsv = async (name: string, cells: readonly (readonly string[])[]): Promise<void> => {
  const text = await csvOf(cells)
  // The mark tells spreadsheets that it is UTF-8.
  const link = document.createElement('a')
  link.href = URL.createObjectURL(new Blob(['\ufeff', text], { type: 'text/csv;charset=utf-8' }))
  link.download = name
  link.click()
  URL.revokeObjectURL(link.href)
}
