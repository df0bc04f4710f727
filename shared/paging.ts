import { z } from 'zod';

/** Query of every list: an opaque cursor from the last answer, and how many. */
export const pageQuery = z.strictObject({
  cursor: z.string().max(200).optional(),
  limit: z.coerce.number().int().min(1).max(60).default(24),
});

/** Answer of every list. */
export const page = <Item extends z.ZodType>(item: Item) =>
  z.object({ items: z.array(item), nextCursor: z.string().nullable() });
