import { createGunzip } from 'node:zlib'
import { pipeline } from 'node:stream/promises'
import { PassThrough, Readable } from 'node:stream'
import { UnreadableFile } from './unreadable'

export const isGzip = (head: Buffer): boolean => head[0] === 0x1F && head[1] === 0x8B

/**
 * The bytes of a file as they are to be read: unpacked where the content is gzip, whatever the name says.
 * The cap counts unpacked bytes, so a small file cannot grow into a large one.
 */
export async function* unpacked(source: AsyncIterable<Buffer>, limits: { mostBytes: number, limitLabel: string }): AsyncGenerator<Buffer> {
  const iterator = source[Symbol.asyncIterator]()
  let head = Buffer.alloc(0)
  while (head.length < 2) {
    const next = await iterator.next()
    if (next.done) break
    head = Buffer.concat([head, next.value])
  }
  const rest = (async function* () {
    if (head.length > 0) yield head
    for (;;) {
      const next = await iterator.next()
      if (next.done) return
      yield next.value
    }
  })()
  let count = 0
  for await (const chunk of isGzip(head) ? gunzipped(rest) : rest) {
    count += chunk.length
    if (count > limits.mostBytes) throw new UnreadableFile('file_too_large_unpacked', { limit: limits.limitLabel })
    yield chunk
  }
}

async function* gunzipped(source: AsyncIterable<Buffer>): AsyncGenerator<Buffer> {
  const out = new PassThrough()
  const gunzip = createGunzip({ chunkSize: 65_536 })
  const done = pipeline(Readable.from(source), gunzip, out).catch((error: unknown) => {
    out.destroy(error instanceof Error ? error : new Error(String(error)))
  })
  try {
    for await (const chunk of out) yield chunk as Buffer
    await done
  }
  catch (error) {
    const code = typeof error === 'object' && error !== null && 'code' in error ? String(error.code) : ''
    if (code === 'Z_BUF_ERROR') throw new UnreadableFile('file_cut', { line: 'unknown' })
    if (code.startsWith('Z_')) throw new UnreadableFile('file_not_gzip')
    throw error
  }
  finally {
    out.destroy()
  }
}
