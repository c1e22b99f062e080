import { createHash, randomUUID } from 'node:crypto'
import { createReadStream, existsSync, type ReadStream } from 'node:fs'
import { mkdir, open, readdir, rename, rm, statfs, type FileHandle } from 'node:fs/promises'
import { join } from 'node:path'
import { refuse } from '#shared/errors'

/** A file that arrived whole and is on the disk, but not kept yet. */
export interface ReceivedFile {
  sha256: Buffer
  size: number
  /** Where it lies until it is kept. */
  path: string
  /** Puts it in its place by its digest; the same bytes twice are one file. */
  keep: () => Promise<void>
  discard: () => Promise<void>
}

export interface FileStore {
  /** @throws {DomainError} too_large, no_room, read_only; whatever goes wrong, nothing stays */
  receive: (body: AsyncIterable<Uint8Array>, limits: { mostBytes: number, expectedBytes?: number }) => Promise<ReceivedFile>
  pathOf: (sha256: Buffer) => string
  has: (sha256: Buffer) => boolean
  read: (sha256: Buffer) => ReadStream
  /** Removes what an earlier process left half received. */
  sweep: () => Promise<number>
}

/** Room that stays free for the database, so that a submission is never the one that finds the disk full. */
const reservedBytes = 64 * 1_048_576

/** Files by their SHA-256 under `files/`. A name that somebody gave a file never becomes a path. */
export function openFileStore(dataDir: string): FileStore {
  const base = join(dataDir, 'files')
  const incoming = join(base, 'incoming')
  const pathOf = (sha256: Buffer) => {
    const hex = sha256.toString('hex')
    return join(base, hex.slice(0, 2), hex)
  }

  async function receive(body: AsyncIterable<Uint8Array>, { mostBytes, expectedBytes }: { mostBytes: number, expectedBytes?: number }): Promise<ReceivedFile> {
    const limit = sizeLabel(mostBytes)
    if (expectedBytes !== undefined && expectedBytes > mostBytes) refuse('too_large', { limit })
    const path = join(incoming, `${randomUUID()}.part`)
    const discard = () => rm(path, { force: true })
    let handle: FileHandle | undefined
    try {
      await mkdir(incoming, { recursive: true })
      await assertRoom(base, expectedBytes ?? 0)
      handle = await open(path, 'wx', 0o600)
      const hash = createHash('sha256')
      let size = 0
      for await (const chunk of body) {
        size += chunk.length
        if (size > mostBytes) refuse('too_large', { limit })
        hash.update(chunk)
        await handle.writeFile(chunk)
      }
      await handle.sync()
      await handle.close()
      handle = undefined
      const sha256 = hash.digest()
      return { sha256, size, path, discard, keep: () => keep(path, pathOf(sha256)) }
    }
    catch (error) {
      await handle?.close().catch(() => {})
      await discard().catch(() => {})
      return refuseDisk(error)
    }
  }

  return {
    receive, pathOf,
    has: sha256 => existsSync(pathOf(sha256)),
    read: sha256 => createReadStream(pathOf(sha256), { highWaterMark: 65_536 }),
    async sweep() {
      const left = await readdir(incoming).catch(() => [])
      for (const name of left) await rm(join(incoming, name), { force: true })
      return left.length
    },
  }
}

/** The file was synced when it was received; its new name is made durable here, by a sync of the folder. */
async function keep(path: string, place: string): Promise<void> {
  const folder = join(place, '..')
  try {
    if (existsSync(place)) {
      await rm(path, { force: true })
      return
    }
    const isNewFolder = await mkdir(folder, { recursive: true }) !== undefined
    await rename(path, place)
    await syncFolder(folder)
    if (isNewFolder) await syncFolder(join(folder, '..'))
  }
  catch (error) {
    await rm(path, { force: true }).catch(() => {})
    refuseDisk(error)
  }
}

async function syncFolder(path: string): Promise<void> {
  const folder = await open(path, 'r')
  try {
    await folder.sync()
  }
  finally {
    await folder.close()
  }
}

async function assertRoom(base: string, bytes: number): Promise<void> {
  const { bavail, bsize } = await statfs(base)
  if (bavail * bsize < bytes + reservedBytes) refuse('no_room')
}

function refuseDisk(error: unknown): never {
  const code = typeof error === 'object' && error !== null && 'code' in error ? String(error.code) : ''
  if (code === 'ENOSPC' || code === 'EDQUOT' || code === 'EIO') refuse('no_room')
  if (code === 'EROFS' || code === 'EACCES' || code === 'EPERM') refuse('read_only')
  throw error
}

export function sizeLabel(bytes: number): string {
  return bytes >= 1_048_576 ? `${Math.floor(bytes / 1_048_576)} MiB` : bytes >= 1024 ? `${Math.floor(bytes / 1024)} KiB` : `${bytes} bytes`
}
