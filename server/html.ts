const ENTITIES: Record<string, string> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
}

/** Text as it may stand in HTML, inside an attribute too. */
export function escapeHtml(text: string): string {
  return text.replaceAll(/[&<>"']/g, (sign) => ENTITIES[sign] ?? sign)
}
