/** Rows of main.db as they stand, in the order of migrations/ground/reference.ts. */
export interface ReferenceBuildTable {
  digest: Buffer
  version: string
  interface: number
  bundle: string
  golden_sha256: Buffer
  added_at: number
}

export interface ConventionRevisionTable {
  id: string
  convention_key: string
  no: number
  body_json: string
  digest: Buffer
}
