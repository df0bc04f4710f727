import { figureWords } from '#shared/surveys/figure-words.ts';
import type { Figure } from '#shared/surveys/result.ts';
import { useUnits } from '#web/lib/units.tsx';

/** Shows a figure of a result in the reader's units. */
export function useShowFigure(): (figure: Pick<Figure, 'value' | 'unit'>) => string {
  const { units } = useUnits();
  return (figure) => figureWords(figure, units);
}
