/** A name that a person's file had, as it is safe to show and to hand out again: no folders, no control or direction marks. */
export function shownFileName(given: string): string {
  const last = given.replaceAll('\\', '/').split('/').pop() ?? ''
  const plain = last.normalize('NFC').replace(/[\p{Cc}\p{Cf}\p{Cs}\p{Zl}\p{Zp}]/gu, '').trim()
  const named = /^\.*$/.test(plain) ? 'record' : plain
  return named.slice(0, 160)
}

/** Content-Disposition for a file that is handed out: always as a download (RFC 6266, RFC 8187). */
export function attachment(name: string): string {
  const ascii = name.replace(/[^\x20-\x7E]|["\\%]/g, '_')
  const extended = encodeURIComponent(name).replace(/['()*]/g, mark => `%${mark.charCodeAt(0).toString(16).toUpperCase()}`)
  return `attachment; filename="${ascii}"; filename*=UTF-8''${extended}`
}

/** The name that a request's header gives, percent-encoded; what cannot be decoded is taken as it stands. */
export function givenFileName(header: string | undefined): string {
  if (header === undefined) return 'record'
  try {
    return decodeURIComponent(header)
  }
  catch {
    return header
  }
}
