/** Words of a title and the beginning of an id, for an address: `five-inch-vertical-3f2a9c1d`. */
export function slugOf(title: string, id: string): string {
  const words = title
    .normalize('NFD')
    .replaceAll(/\p{M}/gu, '')
    .toLowerCase()
    .replaceAll(/[^a-z0-9]+/g, '-')
    .slice(0, 70)
    .replaceAll(/^-|-$/g, '');
  return [...(words === '' ? [] : [words]), id.slice(0, 8)].join('-');
}
