import { expect, it } from 'vitest'
import { buildWorld } from '../../fixtures/world'
import { temporaryStores } from '../../fixtures/temporaryStores'

it('has work in every place, through the use cases', async () => {
  const stores = await temporaryStores()
  try {
    const world = await buildWorld(stores, stores.dataDir)
    expect(Object.keys(world.objects)).toEqual(expect.arrayContaining(['own', 'classmates', 'otherSections', 'otherCourses', 'lastTerms', 'own, not released', 'own, not open']))
    expect(await stores.read.selectFrom('submission').select('id').execute()).toHaveLength(8)
    expect(await stores.read.selectFrom('dispute').select('id').execute()).toHaveLength(5)
    expect((await stores.read.selectFrom('term').select('state').orderBy('state').execute()).map(term => term.state)).toEqual(['closed', 'running'])
  }
  finally {
    await stores.remove()
  }
}, 120_000)
