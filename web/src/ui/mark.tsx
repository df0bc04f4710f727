/** Centres of the eight small holes of the drilled disc, on a 60-unit square. */
const holes: readonly (readonly [number, number])[] = [
  [30, 11.5],
  [43.1, 16.9],
  [48.5, 30],
  [43.1, 43.1],
  [30, 48.5],
  [16.9, 43.1],
  [11.5, 30],
  [16.9, 16.9],
];
const hole = ([x, y]: readonly [number, number]) =>
  `M${String(x)} ${String(y - 3.6)}a3.6 3.6 0 1 0 0 7.2a3.6 3.6 0 1 0 0-7.2z`;
const disc = 'M30 2a28 28 0 1 1 0 56a28 28 0 1 1 0-56zM30 20a10 10 0 1 0 0 20a10 10 0 1 0 0-20z';

/** The mark: a disc drilled like a tubeplate. */
export function Mark({ size = 30 }: { size?: number }) {
  return (
    <svg width={size} height={size} viewBox="0 0 60 60" aria-hidden="true" className="flex-none text-copper">
      <path fill="currentColor" fillRule="evenodd" d={disc + holes.map(hole).join('')} />
    </svg>
  );
}

/** Something is on its way: the holes fill one by one. */
export function Loading({ what = 'Loading' }: { what?: string }) {
  return (
    <output className="flex items-center gap-3 py-8 text-pencil">
      <svg width={40} height={40} viewBox="0 0 60 60" aria-hidden="true" className="text-copper">
        <path fill="none" stroke="currentColor" strokeWidth={2} d={disc} />
        {holes.map((each, index) => (
          <path
            key={each.join()}
            d={hole(each)}
            fill="currentColor"
            opacity={0.25}
            className={`animate-[hole-fills_1.6s_linear_infinite] ${delays[index] ?? ''}`}
          />
        ))}
      </svg>
      {what}…
    </output>
  );
}

const delays = [
  '[animation-delay:0s]',
  '[animation-delay:0.2s]',
  '[animation-delay:0.4s]',
  '[animation-delay:0.6s]',
  '[animation-delay:0.8s]',
  '[animation-delay:1s]',
  '[animation-delay:1.2s]',
  '[animation-delay:1.4s]',
];
