/** Hands a fetched file to the browser to keep. */
export function saveFile(file: Blob, name: string): void {
  const address = URL.createObjectURL(file)
  const link = document.createElement('a')
  link.href = address
  link.download = name
  link.click()
  // Revoked at once, some browsers save an empty file.
  setTimeout(() => URL.revokeObjectURL(address), 60_000)
}
