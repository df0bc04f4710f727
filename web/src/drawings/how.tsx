import type { ReactNode } from 'react';

const line = {
  fill: 'none',
  stroke: 'currentColor',
  strokeWidth: 1.5,
  strokeLinejoin: 'round',
  strokeLinecap: 'round',
} as const;
const thin = { ...line, strokeWidth: 0.9 } as const;

function Sheet({ label, children }: { label: string; children: ReactNode }) {
  return (
    <svg viewBox="0 0 240 160" role="img" aria-label={label} className="w-full text-ink">
      <defs>
        <pattern
          id="how-hatch"
          width="5"
          height="5"
          patternUnits="userSpaceOnUse"
          patternTransform="rotate(45)"
        >
          <path d="M0 0V5" className="stroke-copper" strokeWidth="1.2" />
        </pattern>
      </defs>
      {children}
    </svg>
  );
}

const centreLine = (d: string) => (
  <path d={d} className="stroke-copper" strokeWidth={0.9} strokeDasharray="14 3 3 3" fill="none" />
);

/** A boiler on a bench with a camera before it. */
export function HowList() {
  return (
    <Sheet label="A boiler on a bench being photographed">
      <path {...line} d="M10 130h150M20 130v18M150 130v18" />
      <rect x="52" y="44" width="4" height="86" fill="url(#how-hatch)" />
      <rect x="112" y="44" width="4" height="86" fill="url(#how-hatch)" />
      <path {...line} d="M52 44h64v86H52zM58 44l8-16h36l8 16M74 28V10h20v18" />
      <path {...thin} d="M66 50v50M73 50v50M81 50v50M87 50v50M95 50v50M102 50v50M60 100h48v30" />
      <path {...thin} d="M116 60h12v30h-12" />
      {centreLine('M84 4v134')}
      <path {...line} d="M178 78h44v32h-44zM186 78l4-8h12l4 8" />
      <circle {...line} cx="200" cy="94" r="10" />
      <circle {...thin} cx="200" cy="94" r="5" />
      <path {...thin} d="M176 94h-40" strokeDasharray="2 4" />
    </Sheet>
  );
}

/** A fee set aside under lock until the report is in. */
export function HowCommission() {
  return (
    <Sheet label="A fee held in a locked box between buyer and surveyor">
      <path {...line} d="M76 62h88v66H76zM76 80h88" />
      <rect x="76" y="62" width="88" height="18" fill="url(#how-hatch)" />
      <path {...line} d="M108 62V46a12 12 0 0 1 24 0v16" />
      <circle {...line} cx="120" cy="100" r="6" />
      <path {...line} d="M120 106v12" />
      <circle {...line} cx="30" cy="84" r="13" />
      <path {...line} d="M10 128c2-20 10-27 20-27s18 7 20 27" />
      <circle {...line} cx="210" cy="84" r="13" />
      <path {...line} d="M190 128c2-20 10-27 20-27s18 7 20 27" />
      <path {...thin} d="M50 96h18M64 92l5 4-5 4M172 96h16" strokeDasharray="3 3" />
      {centreLine('M120 30v112')}
    </Sheet>
  );
}

/** A boiler full of water under a hand pump, its gauge watched. */
export function HowExamine() {
  return (
    <Sheet label="A boiler under hydraulic test by a hand pump with a large gauge">
      <rect x="96" y="52" width="118" height="4" fill="url(#how-hatch)" />
      <rect x="96" y="116" width="118" height="4" fill="url(#how-hatch)" />
      <path {...line} d="M96 52h118v68H96zM106 120v14M204 120v14M92 134h126" />
      <path {...thin} d="M104 64h102M104 76h102M104 96h102M104 108h102" />
      {centreLine('M84 86h142')}
      <circle {...line} cx="62" cy="40" r="24" />
      <circle {...thin} cx="62" cy="40" r="19" />
      <path {...line} d="M62 40l12-12M62 64v18h34" />
      <path {...thin} d="M48 46l-3 2M47 36l-3-1M53 28l-2-3M62 25v-3M71 28l2-3M77 35l3-1M76 45l3 2" />
      <path {...line} d="M20 134V98h20v36zM30 98V84M14 84h32M40 124h22V82" />
    </Sheet>
  );
}

/** A report with numbered balloons, and a decision to take. */
export function HowDecide() {
  return (
    <Sheet label="A report sheet with numbered balloons on a drawing">
      <path {...line} d="M40 12h160v136H40zM40 120h160M120 120v28M164 120v28" />
      <path {...line} d="M92 40h40v62H92zM98 40l6-12h16l6 12" />
      <rect x="92" y="40" width="4" height="62" fill="url(#how-hatch)" />
      <rect x="128" y="40" width="4" height="62" fill="url(#how-hatch)" />
      {centreLine('M112 20v92')}
      <circle cx="64" cy="46" r="9" className="fill-sound" />
      <circle cx="64" cy="88" r="8" fill="none" className="stroke-attention" strokeWidth="2" />
      <path d="M64 80a8 8 0 0 1 0 16z" className="fill-attention" />
      <circle cx="168" cy="46" r="8" fill="none" className="stroke-serviceable" strokeWidth="2" />
      <circle cx="168" cy="46" r="3.4" className="fill-serviceable" />
      <circle cx="168" cy="88" r="8" fill="none" className="stroke-unfit" strokeWidth="2" />
      <path d="M163 83l10 10M173 83l-10 10" className="stroke-unfit" strokeWidth="2" />
      <path
        {...thin}
        d="M73 48l21 8M72 86l22-4M160 48l-28 6M160 86l-30-6M48 130h60M48 138h40M128 134h28M172 134h20"
      />
    </Sheet>
  );
}
