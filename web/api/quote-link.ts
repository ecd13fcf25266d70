/*
 * The private link by which a quote was opened. It stays in this tab, so that the way back from the card processor
 * still finds its order, and is sent in a header: an address would end up in logs.
 */
const KEY = 'quote-link'

export const quoteLink = {
  read(): string | null {
    return sessionStorage.getItem(KEY)
  },
  keep(token: string): void {
    sessionStorage.setItem(KEY, token)
  },
  forget(): void {
    sessionStorage.removeItem(KEY)
  },
}
