import type { H3Event } from 'h3'

const idleMs = 60_000
const drainMs = 5_000

/**
 * The bytes of a request as they come. A body that is refused before its end is let run out for a moment, so that the sender
 * reads the answer instead of a broken connection; a sender that falls silent is cut off. The answer must not say that it closes
 * the connection: Node would break it with the answer's last byte, and a sender that still writes never reads it.
 */
export function requestBody(event: H3Event): AsyncIterable<Uint8Array> {
  const { req, res } = event.node
  req.setTimeout(idleMs, () => req.destroy())
  res.once('finish', () => {
    if (req.complete || req.destroyed) return
    req.resume()
    setTimeout(() => req.destroy(), drainMs).unref()
  })
  return { [Symbol.asyncIterator]: () => req.iterator({ destroyOnReturn: false }) as AsyncIterator<Uint8Array> }
}
