const mostBytes = 1_400_000

/** A small text file as text: UTF-8, else what older spreadsheets write, which is told since a name may then look odd. */
export async function readTextFile(file: File): Promise<{ text: string, told: string | null } | { reason: string }> {
  if (file.size === 0) return { reason: `${file.name} is empty.` }
  if (file.size > mostBytes) return { reason: `${file.name} is larger than 1.4 MB. A roster is a short list; is it the right file?` }
  const bytes = new Uint8Array(await file.arrayBuffer())
  if (bytes.includes(0)) return { reason: `${file.name} is not a text file. Save the roster as CSV and choose that.` }
  try {
    return { text: new TextDecoder('utf-8', { fatal: true }).decode(bytes), told: null }
  }
  catch {
    return { text: new TextDecoder('windows-1252').decode(bytes), told: 'The file is not UTF-8; it was read as Windows-1252. Look at names with accents before you go on.' }
  }
}
