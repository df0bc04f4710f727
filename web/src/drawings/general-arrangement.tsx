import { useId } from 'react';
import { Link } from 'react-router-dom';
import type { BoilerFacts } from '#shared/boilers/boiler.ts';
import { balloonRadius, drawingOf } from '#shared/drawings/index.ts';
import type { Balloon, StrokeKind } from '#shared/drawings/drawing.ts';
import { grades } from '#shared/surveys/record.ts';
import type { Grade } from '#shared/surveys/record.ts';
import { criterionOf, rubricOf } from '#shared/surveys/rubric/index.ts';
import { GradeMark } from '#web/ui/grade-mark.tsx';

const looks: Readonly<Record<StrokeKind, string>> = {
  outline: 'fill-none stroke-ink stroke-[1.8]',
  thin: 'fill-none stroke-ink stroke-1',
  hidden: 'fill-none stroke-ink stroke-1 [stroke-dasharray:6_4]',
  centre: 'fill-none stroke-copper stroke-[0.9] [stroke-dasharray:14_3_3_3]',
  cut: 'stroke-ink stroke-[1.2]',
  water: 'fill-none stroke-slate stroke-1',
};

interface Props {
  facts: BoilerFacts;
  rubricVersion: string;
  /** Said for who cannot see it. */
  label: string;
  /** The grade of each item, where there has been a survey. */
  gradeOf?: (criterionId: string) => Grade | undefined;
  /** Where an item's balloon leads; without it they are only numbers. */
  hrefOf?: (criterionId: string) => string;
}

/** The general arrangement of a boiler in section, its numbered balloons leading to the items of the method. */
export function GeneralArrangement({ facts, rubricVersion, label, gradeOf, hrefOf }: Props) {
  const hatch = useId();
  const rubric = rubricOf(rubricVersion);
  const { width, height, strokes, balloons } = drawingOf(facts, rubric);
  return (
    // What scrolls must be reachable by keyboard.
    // oxlint-disable-next-line jsx-a11y/no-noninteractive-tabindex
    <section className="overflow-x-auto" aria-label={label} tabIndex={0}>
      <svg
        viewBox={`0 0 ${String(width)} ${String(height)}`}
        role={hrefOf ? 'group' : 'img'}
        aria-label={label}
        className="mx-auto w-full max-w-4xl min-w-[42rem]"
      >
        <defs>
          <pattern
            id={hatch}
            width="5"
            height="5"
            patternUnits="userSpaceOnUse"
            patternTransform="rotate(45)"
          >
            <path d="M0 0V5" className="stroke-copper" strokeWidth="1.4" />
          </pattern>
        </defs>
        <g aria-hidden="true" strokeLinejoin="round" strokeLinecap="round">
          {strokes.map(({ d, kind }) => (
            <path
              key={kind + d}
              d={d}
              className={looks[kind]}
              {...(kind === 'cut' && { fill: `url(#${hatch})`, fillRule: 'evenodd' as const })}
            />
          ))}
          {balloons.map(({ criterionId, x, y, to }) =>
            to === null ? null : (
              <g key={criterionId}>
                <path
                  d={`M${String(x)} ${String(y)}L${String(to[0])} ${String(to[1])}`}
                  className="fill-none stroke-pencil stroke-[0.7]"
                />
                <circle cx={to[0]} cy={to[1]} r={2} className="fill-pencil" />
              </g>
            ),
          )}
        </g>
        {balloons.map((balloon) => (
          <NumberedBalloon
            key={balloon.criterionId}
            balloon={balloon}
            title={criterionOf(balloon.criterionId, rubric)?.title ?? ''}
            grade={gradeOf?.(balloon.criterionId)}
            href={hrefOf?.(balloon.criterionId)}
          />
        ))}
      </svg>
    </section>
  );
}

interface BalloonProps {
  balloon: Balloon;
  title: string;
  grade: Grade | undefined;
  href: string | undefined;
}

function NumberedBalloon({ balloon, title, grade, href }: BalloonProps) {
  const { x, y, number } = balloon;
  const name = [String(number), title, grade && grades[grade]].filter(Boolean).join(', ');
  const drawn = (
    <>
      <circle cx={x} cy={y} r={balloonRadius} className="fill-sheet stroke-ink stroke-1" />
      <text x={x} y={y + 4} textAnchor="middle" className="fill-ink text-[0.6875rem] font-medium">
        {number}
      </text>
      {grade !== undefined && (
        <g transform={`translate(${String(x + (x < 350 ? -19 : 5))} ${String(y + 2)})`}>
          <circle cx={7} cy={7} r={8} className="fill-sheet" />
          <GradeMark grade={grade} size={14} />
        </g>
      )}
    </>
  );
  if (href === undefined) return <g aria-hidden="true">{drawn}</g>;
  return (
    <Link to={href} aria-label={name}>
      {drawn}
    </Link>
  );
}
