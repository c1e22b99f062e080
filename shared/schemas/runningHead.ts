import { z } from 'zod'

/** What waits at the places of a course; the teaching week that today is in, null outside of them. */
export const placesReply = z.object({
  week: z.number().int().nullable(),
  counts: z.object({ due: z.number().int(), open: z.number().int(), fresh: z.number().int() }),
})
export type PlacesReply = z.infer<typeof placesReply>

/** The roof's last reading; null where no station record may be shown. */
export const roofReply = z.object({
  reading: z.object({
    at: z.string(), wall: z.string(),
    values: z.array(z.object({ quantity: z.string(), value: z.number(), unit: z.string(), digits: z.number().int() })),
  }).nullable(),
})
export type RoofReply = z.infer<typeof roofReply>
