import { uploadReply } from '#shared/schemas/dataReplies'
import type { z } from 'zod'

export type Uploaded = z.output<typeof uploadReply>
export interface Sending { done: Promise<Uploaded>, stop: () => void }

/** Sends a file's bytes as they are, telling how far it is. Fails with the server's own words where it gave some. */
export function sendFile(path: string, file: File, onProgress: (sent: number) => void): Sending {
  const request = new XMLHttpRequest()
  const done = new Promise<Uploaded>((resolve, reject) => {
    request.upload.addEventListener('progress', event => onProgress(event.loaded))
    request.addEventListener('load', () => {
      const answer = parsed(request.responseText)
      const read = uploadReply.safeParse(answer)
      if (request.status === 201 && read.success) resolve(read.data)
      else reject(Object.assign(new Error('refused'), { data: answer, statusCode: request.status }))
    })
    request.addEventListener('error', () => reject(new Error('no connection')))
    request.addEventListener('abort', () => reject(new DOMException('stopped', 'AbortError')))
    request.open('POST', path)
    request.setRequestHeader('Content-Type', 'application/octet-stream')
    request.setRequestHeader('X-File-Name', encodeURIComponent(file.name))
    request.setRequestHeader('Idempotency-Key', crypto.randomUUID())
    request.send(file)
  })
  return { done, stop: () => request.abort() }
}

function parsed(text: string): unknown {
  try {
    return JSON.parse(text)
  }
  catch {
    return null
  }
}
