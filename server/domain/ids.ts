import { v7 } from 'uuid'

/** A new identifier (UUIDv7). Order never comes from it: `seq` columns say what came first. */
export const newId = (now: number): string => v7({ msecs: now })
