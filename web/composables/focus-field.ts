/** Moves the focus to the field of a path, opening what it is folded into. */
export function focusField(path: string): boolean {
  const field = document.querySelector<HTMLElement>(`[data-path="${CSS.escape(path)}"]`)
  const fold = field?.closest('details')
  if (fold) fold.open = true
  const control = field?.querySelector<HTMLElement>('input, textarea, [role="combobox"], button')
  control?.focus()
  return control !== null && control !== undefined
}
