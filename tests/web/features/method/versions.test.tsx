import { fireEvent, render, screen } from '@testing-library/react';
import { MemoryRouter } from 'react-router-dom';
import { describe, expect, it } from 'vitest';
import { differencesBetween, methodData } from '#shared/surveys/method.ts';
import type { MethodData } from '#shared/surveys/method.ts';
import { rubricOf, rubricVersion } from '#shared/surveys/rubric/index.ts';
import { Versions } from '#web/features/method/versions.tsx';

const show = (method: MethodData) =>
  render(
    <MemoryRouter>
      <Versions method={method} />
    </MemoryRouter>,
  );

describe('the versions of the method', () => {
  it('sets any two side by side, whichever is named first', () => {
    show(methodData());
    const expected = differencesBetween(rubricOf('1.0.0'), rubricOf('1.1.0'));
    expect(expected.length).toBeGreaterThan(0);
    for (const [one, other] of [
      ['1.0.0', '1.1.0'],
      ['1.1.0', '1.0.0'],
    ] as const) {
      fireEvent.change(screen.getByLabelText('One version'), { target: { value: one } });
      fireEvent.change(screen.getByLabelText('The other'), { target: { value: other } });
      for (const { text } of expected) expect(screen.getByText(text)).toBeTruthy();
    }
    fireEvent.change(screen.getByLabelText('One version'), { target: { value: '1.0.0' } });
    expect(screen.getByText('That is the same version twice.')).toBeTruthy();
  });

  it('leads to every version but the one shown', () => {
    show(methodData('1.0.0'));
    expect(screen.getByText(`Read version ${rubricVersion}`).getAttribute('href')).toBe('/method');
    expect(screen.queryByText('Read version 1.0.0')).toBeNull();
  });

  it('has nothing to compare while only one is published', () => {
    const method = methodData();
    show({ ...method, versions: method.versions.slice(0, 1) });
    expect(screen.getByText(/Only one version is published/)).toBeTruthy();
    expect(screen.queryByLabelText('One version')).toBeNull();
  });
});
