import type { Figure } from '#shared/surveys/result.ts';
import { formatNumber } from '#web/lib/format.ts';
import { useUnits } from '#web/lib/units.tsx';

/** Shows a figure of a result in the reader's units. */
export function useShowFigure(): (figure: Pick<Figure, 'value' | 'unit'>) => string {
  const { show } = useUnits();
  return ({ value, unit }) => {
    switch (unit) {
      case 'Pa':
        return show('pressure', value);
      case 'mm':
        return show('length', value);
      case 'L':
        return show('volume', value);
      case 'count':
        return formatNumber(value);
      case '%':
        return `${formatNumber(value, 1)} %`;
      case 'day':
        return value === 1 ? '1 day' : `${formatNumber(value)} days`;
      case 'ppm':
      case 'kg/h':
      case 'min':
      case 'bar·L':
      case 'kW':
        return `${formatNumber(value, 1)} ${unit}`;
      default:
        return unit satisfies never;
    }
  };
}
