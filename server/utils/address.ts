import { isIP } from 'node:net'
import type { H3Event } from 'h3'

/**
 * Where a request comes from: the socket's other end. Behind a proxy that is the proxy, so TRUST_PROXY says how many proxies of our own
 * stand in front (0 unless said), and then the address that the outermost of them saw counts. What the client itself puts
 * into X-Forwarded-For lies further left and is never read. An IPv6 customer has a whole /64.
 */
export function addressOf(event: H3Event, env: NodeJS.ProcessEnv = process.env): string {
  const socket = plain(event.node.req.socket.remoteAddress ?? '')
  const proxies = proxiesOf(env.TRUST_PROXY)
  if (proxies === 0) return networkOf(socket)
  const header = event.node.req.headers['x-forwarded-for']
  const seen = (Array.isArray(header) ? header.join(',') : header ?? '').split(',').map(part => plain(part.trim())).filter(part => part !== '')
  const address = seen.at(-proxies)
  return networkOf(address !== undefined && isIP(address) !== 0 ? address : socket)
}

export function proxiesOf(text: string | undefined): number {
  if (text === undefined || text === '') return 0
  if (!/^[0-9]$/.test(text)) throw new Error(`TRUST_PROXY is the number of proxies in front, 0 to 9; it is "${text}".`)
  return Number(text)
}

const plain = (address: string) => address.replace(/^::ffff:(?=\d+\.)/i, '')

function networkOf(address: string): string {
  if (isIP(address) !== 6) return address
  const [head = '', tail] = address.split('%')[0]!.split('::')
  const left = head === '' ? [] : head.split(':')
  const right = tail === undefined || tail === '' ? [] : tail.split(':')
  const groups = tail === undefined ? left : [...left, ...Array<string>(Math.max(0, 8 - left.length - right.length)).fill('0'), ...right]
  return `${groups.slice(0, 4).map(group => Number.parseInt(group, 16).toString(16)).join(':')}::/64`
}
