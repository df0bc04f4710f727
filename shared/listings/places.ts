import { z } from 'zod';

/** A town of the gazetteer: public, and as near as a listing ever says where it is. */
export const town = z.object({
  id: z.int(),
  name: z.string(),
  region: z.string(),
  country: z.string(),
  latitude: z.number(),
  longitude: z.number(),
});
export type Town = z.infer<typeof town>;
