import { defineEventHandler, setResponseStatus } from 'h3'
import { openStores } from '../utils/useStores'

/** 200 when the data directory is writable and migrated. */
export default defineEventHandler(async (event) => {
  try {
    const database = await openStores()
    database.raw.exec('begin immediate; rollback')
    return { ready: true }
  }
  catch (error) {
    setResponseStatus(event, 503)
    return { ready: false, why: error instanceof Error ? error.message : 'not ready' }
  }
})
