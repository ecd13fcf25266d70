/** A customer. */
export interface CompaniesTable {
  id: string
  name: string
  /** Number of the exemption certificate on file; null: it pays tax. */
  taxCertificate: string | null
  /** 1: work is released before the deposit is in. */
  creditTerms: 0 | 1
  createdAt: string
}
