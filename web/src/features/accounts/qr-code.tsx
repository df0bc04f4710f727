import { queryOptions, useQuery } from '@tanstack/react-query';

const qrQuery = (text: string) =>
  queryOptions({
    queryKey: ['qr-code', text] as const,
    queryFn: async () => {
      const { create } = await import('qrcode');
      const { data, size } = create(text, { errorCorrectionLevel: 'M' }).modules;
      return {
        size,
        dark: Array.from(data, (bit, index) => (bit ? index : -1)).filter((index) => index >= 0),
      };
    },
    staleTime: Infinity,
  });

/** A QR code drawn as a path; black on white in any theme, as readers want it. */
export function QrCode({ text }: { text: string }) {
  const { data } = useQuery(qrQuery(text));
  if (!data) return <div className="size-48" />;
  const { size, dark } = data;
  const path = dark
    .map((index) => `M${String(index % size)} ${String(Math.floor(index / size))}h1v1h-1z`)
    .join('');
  return (
    <svg
      viewBox={`-4 -4 ${String(size + 8)} ${String(size + 8)}`}
      className="size-48 bg-white"
      role="img"
      aria-label="QR code of the key below"
    >
      <path d={path} fill="black" />
    </svg>
  );
}
