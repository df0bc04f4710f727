import type { BodyOf } from '#shared/endpoint.ts';
import { Problem } from '#shared/problem.ts';
import { methodData } from '#shared/surveys/method.ts';
import type { MethodData } from '#shared/surveys/method.ts';
import type { scoreBySurveyMethod } from '#shared/surveys/contract.ts';
import { rubricVersion, rubricVersions } from '#shared/surveys/rubric/index.ts';
import type { SurveyResult } from '#shared/surveys/result.ts';
import { scoreSurvey } from '#shared/surveys/score.ts';
import { unknownWords } from '#shared/surveys/vocabulary.ts';

/** The method as published under a version; the current one unless told otherwise. @throws Problem not-found. */
export function getMethod(version: string = rubricVersion): MethodData {
  if (!rubricVersions.some((each) => each.version === version))
    throw new Problem('not-found', `There is no version ${version} of the method.`);
  return methodData(version);
}

/** Scores what anyone sends, as a filed survey would be scored. @throws Problem invalid-input. */
export function scoreBySurvey(survey: BodyOf<typeof scoreBySurveyMethod>): SurveyResult {
  const unknown = unknownWords(survey.record);
  if (unknown.length > 0)
    throw new Problem('invalid-input', 'Some words are not in that version of the method.', unknown);
  return scoreSurvey(survey);
}
