import { sizeLabel } from '../../files/store'

/** Largest upload, and largest content of a packed one. */
export function uploadLimit(env: Readonly<Record<string, string | undefined>> = process.env): { mostBytes: number, limitLabel: string } {
  const set = Number(env.UPLOAD_MAX_BYTES)
  const mostBytes = Number.isSafeInteger(set) && set > 0 ? set : 512 * 1_048_576
  return { mostBytes, limitLabel: sizeLabel(mostBytes) }
}
