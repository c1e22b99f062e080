/** Rows of main.db as they stand, in the order of migrations/ground/data.ts. */
export interface SourceFileTable {
  sha256: Buffer
  size: number
  stored_at: number
}

export interface UploadTable {
  id: string
  course_id: string | null
  source_sha256: Buffer
  original_name: string
  by_actor_id: string
  at: number
}

export interface SensorTable {
  id: string
  instrument: string
  quantity: string
  unit: string
  site_json: string
  serves_from: number
  serves_to: number | null
}

export interface SensorAccuracyTable {
  id: string
  sensor_id: string
  valid_from: number
  valid_to: number | null
  half_width: number
  coverage_k: number
  resolution: number
  time_constant_s: number | null
  source: string
}

export interface RecipeRevisionTable {
  id: string
  recipe_key: string
  no: number
  body_json: string
  digest: Buffer
}

export interface DataSetTable {
  id: string
  owner_course_id: string | null
  kind: 'station' | 'flight'
  title: string
}

export interface DataSetVersionTable {
  id: string
  data_set_id: string
  no: number
  parent_id: string | null
  cause: 'import' | 'append' | 'flag' | 'correct' | 'derive'
  reason: string
  root_sha256: Buffer
  rows_read: number
  rows_taken: number
  rows_refused: number
  first_at: number | null
  last_at: number | null
  recipe_revision_id: string | null
  importer: string
  meta_json: string
  by_actor_id: string
  made_at: number
}

export interface DataSetVersionSourceTable {
  version_id: string
  ordinal: number
  source_sha256: Buffer
}

export interface DataColumnTable {
  version_id: string
  no: number
  name: string
  quantity: string
  unit_ucum: string
  decimals: number | null
  height_m: number | null
  role: 'time' | 'value' | 'quality' | 'label'
  sensor_accuracy_id: string | null
}
