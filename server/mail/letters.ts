/** Every letter of the desk with what it says. Nothing internal goes into one: no cost, no margin. */
export type Letter =
  | {
      kind: 'request received'
      data: {
        name: string
        shop: string
        number: string
        title: string
        marks: number
        pieces: number
        url: string
      }
    }
  | {
      kind: 'quote sent'
      data: {
        name: string
        shop: string
        quote: string
        title: string
        total: string
        /** Instant, ISO 8601. */
        validUntil: string
        note: string
        /** The private link. */
        url: string
      }
    }
  | { kind: 'quote accepted'; data: Accepted & { name: string } }
  | { kind: 'quote accepted for shop'; data: Accepted & { company: string } }
  | { kind: 'deposit receipt'; data: Paid & { at: string } }
  | { kind: 'payment failed'; data: Paid & { reason: string } }

interface Accepted {
  shop: string
  quote: string
  title: string
  order: string
  acceptedBy: string
  deposit: string
  url: string
}

interface Paid {
  name: string
  shop: string
  order: string
  title: string
  amount: string
  url: string
}
