import { useMemo, useState } from 'react';
import type { ReactNode } from 'react';
import { exampleSurvey } from '#shared/surveys/example.ts';
import type { SurveyResult } from '#shared/surveys/result.ts';
import { scoreSurvey } from '#shared/surveys/score.ts';
import { Select } from '#web/ui/select.tsx';
import { carbonMonoxideChoices, hydraulicChoices, isUntouched, steamChoices } from './trial.ts';
import { surveyOf, untouched, withGrade } from './trial.ts';
import type { Trial } from './trial.ts';
import { TrialGrades } from './trial-grades.tsx';
import { TrialResult } from './trial-result.tsx';

interface Props {
  /** Version of the method that it is scored by. */
  version: string;
  /** How a report shows its result, so that the example looks as a report does. */
  summaryOf: (result: SurveyResult) => ReactNode;
}

/** An invented boiler and its findings, for the reader to change: scored in the browser as reports are. */
export function TryIt({ version, summaryOf }: Props) {
  const [trial, setTrial] = useState<Trial>(untouched);
  const start = useMemo(() => exampleSurvey(version), [version]);
  const survey = useMemo(() => surveyOf(trial, version), [trial, version]);
  const result = useMemo(() => scoreSurvey(survey), [survey]);
  const change = (changed: Partial<Trial>) => {
    setTrial({ ...trial, ...changed });
  };
  return (
    <div className="lg:grid lg:grid-cols-[minmax(0,7fr)_minmax(0,5fr)] lg:gap-x-10">
      <TrialResult
        result={result}
        summaryOf={summaryOf}
        onReset={
          isUntouched(trial)
            ? null
            : () => {
                setTrial(untouched);
              }
        }
      />
      <form
        aria-label="Findings to change"
        className="grid content-start gap-6 pt-5 lg:col-start-1 lg:row-start-1 lg:pt-0"
        onSubmit={(event) => {
          event.preventDefault();
        }}
      >
        <fieldset className="grid min-w-0 gap-4 sm:grid-cols-3">
          <legend className="mb-2 text-label text-pencil">Tests</legend>
          <Select
            label="Hydraulic test"
            value={trial.hydraulic}
            options={hydraulicChoices}
            onChange={(hydraulic) => {
              if (hydraulic) change({ hydraulic });
            }}
          />
          <Select
            label="Steam test"
            value={trial.steam}
            options={steamChoices}
            onChange={(steam) => {
              if (steam) change({ steam });
            }}
          />
          <Select
            label="Carbon monoxide"
            value={trial.carbonMonoxide}
            options={carbonMonoxideChoices}
            onChange={(carbonMonoxide) => {
              if (carbonMonoxide) change({ carbonMonoxide });
            }}
          />
          <p className="text-sm leading-5 text-pencil sm:col-span-3">
            Carbon monoxide is read where the operator stands, in the steam test.
          </p>
        </fieldset>
        <TrialGrades
          facts={survey.facts}
          start={start.record}
          record={survey.record}
          onGrade={(criterionId, grade, startedAs) => {
            setTrial(withGrade(trial, criterionId, grade, startedAs));
          }}
        />
      </form>
    </div>
  );
}
