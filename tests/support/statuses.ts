/** Sends requests one after another and says how each was answered. */
export async function statusesOf(...requests: PromiseLike<{ status: number }>[]): Promise<number[]> {
  const statuses: number[] = [];
  for (const request of requests) statuses.push((await request).status);
  return statuses;
}
