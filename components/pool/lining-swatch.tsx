import type { surfaceAnswers } from '@/lib/schemas/pool-profile';

type Surface = (typeof surfaceAnswers)[number];

const textures: Record<Surface, React.ReactNode> = {
  plaster: (
    <path d="M7 12h2M20 8h2M34 14h2M12 24h2M27 22h2M38 30h2M8 34h2M21 36h2M32 38h2M15 16h1M30 30h1" strokeWidth="1.6" />
  ),
  tile: <path d="M1 12H45M1 23H45M1 34H45M12 1V45M23 1V45M34 1V45" strokeWidth="1" />,
  vinyl: (
    <path
      d="M1 10q5.5 -5 11 0t11 0t11 0t11 0M1 21q5.5 -5 11 0t11 0t11 0t11 0M1 32q5.5 -5 11 0t11 0t11 0t11 0M1 43q5.5 -5 11 0t11 0t11 0t11 0"
      strokeWidth="1"
    />
  ),
  fibreglass: <path d="M4 40L20 6M14 42L34 8M26 42L42 14M6 10L30 40M20 4L43 34" strokeWidth="0.8" />,
  painted: <path d="M6 8H40M6 15H34M6 22H40M6 29H28M6 36H38" strokeWidth="3.2" strokeLinecap="round" opacity="0.75" />,
  unsure: <path d="M17 17a6 6 0 1 1 8.5 5.5c-2 1 -2.5 2 -2.5 4M23 32v1" strokeWidth="2" strokeLinecap="round" />,
};

/** What a hand feels along the wall, engraved. */
export function LiningSwatch({ surface }: { surface: Surface }) {
  return (
    <svg width="46" height="46" viewBox="0 0 46 46" aria-hidden="true" className="shrink-0 fill-none stroke-ink">
      <rect
        x="1"
        y="1"
        width="44"
        height="44"
        className="fill-paper-lift"
        strokeWidth="1.4"
        {...(surface === 'unsure' ? { strokeDasharray: '3 3' } : {})}
      />
      {textures[surface]}
    </svg>
  );
}
