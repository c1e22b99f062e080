import type { LibraryTexts } from '../domain/labs/library/readyLabs'

let texts: LibraryTexts | null = null

/** The texts of the library, which are built in: they do not change while the server runs. */
export async function useReadyLabs(): Promise<LibraryTexts> {
  if (texts) return texts
  const storage = useStorage('assets:content')
  const names = (await storage.getKeys('labs')).filter(name => name.endsWith('.md'))
  texts = new Map(await Promise.all(names.map(async name => [name.replace(/^labs:/, '').replace(/\.md$/, ''), String(await storage.getItem(name))] as const)))
  return texts
}
