/*
 * An invented world: no firm, person or place of ours exists. These people are made in demo mode only, all with one
 * password that the README names.
 */
export const DEMO_PASSWORD = 'plumb-line-42'

export const DEMO_COMPANIES = [
  { key: 'tessell', name: 'Tessell & Daughters Building', taxCertificate: null },
  { key: 'quillon', name: 'Quillon Bay Contractors', taxCertificate: 'EM-7731-X' },
] as const

export const DEMO_PEOPLE = [
  { name: 'Maren Tessell', email: 'contractor@plumbrule.example', role: 'contractor', company: 'tessell' },
  { name: 'Idris Vane', email: 'estimator@plumbrule.example', role: 'estimator', company: null },
  { name: 'Petra Holm', email: 'accounts@plumbrule.example', role: 'accounts', company: null },
  { name: 'Osric Larkfield', email: 'admin@plumbrule.example', role: 'admin', company: null },
  { name: 'Bram Quillon', email: 'other@plumbrule.example', role: 'contractor', company: 'quillon' },
] as const
