import { setResponseHeaders, type H3Event } from 'h3'
import { attachment } from '../domain/data/fileName'

/** Headers of a file that is handed out: never shown in the page, never run, whatever is in it. */
export function asDownload(event: H3Event, file: { name: string, type: string, size?: number }): void {
  setResponseHeaders(event, {
    'Content-Type': file.type,
    'Content-Disposition': attachment(file.name),
    'X-Content-Type-Options': 'nosniff',
    'Content-Security-Policy': 'default-src \'none\'; sandbox',
    ...(file.size === undefined ? {} : { 'Content-Length': file.size }),
  })
}
