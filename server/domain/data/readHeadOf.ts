import type { FileStore } from '../../files/store'
import { unpacked } from '../../importing/unpack'

/** The first bytes of a kept file, unpacked where it is packed. */
export async function readHeadOf(files: FileStore, sha256: Buffer, most: number): Promise<{ bytes: Buffer, isWhole: boolean }> {
  const parts: Buffer[] = []
  let count = 0
  const source = files.read(sha256)
  try {
    for await (const chunk of unpacked(source, { mostBytes: Number.MAX_SAFE_INTEGER, limitLabel: '' })) {
      parts.push(chunk)
      count += chunk.length
      if (count >= most) return { bytes: Buffer.concat(parts), isWhole: false }
    }
  }
  finally {
    source.destroy()
  }
  return { bytes: Buffer.concat(parts), isWhole: true }
}
