import { createHash } from 'node:crypto';
import type { BoilerFacts } from '#shared/boilers/boiler.ts';
import { canonicalJson, compareCodeUnits } from '#shared/surveys/canonical.ts';
import type { SignOff, SurveyRecord } from '#shared/surveys/record.ts';
import type { SurveyResult } from '#shared/surveys/result.ts';
import type { ExtraId, ScopeId } from '#shared/surveys/scopes.ts';

/** What a report's digest stands for. */
export interface Filed {
  scope: ScopeId;
  extras: readonly ExtraId[];
  facts: BoilerFacts;
  record: SurveyRecord;
  result: SurveyResult;
  signOff: SignOff;
  rubricVersion: string;
  /** Only of a corrected version. */
  correction?: { correctsReportId: string; version: number; reason: string } | undefined;
}

/** SHA-256, hex, over the canonical JSON of what was filed and the hashes of its photographs as received. */
export function digestOf(filed: Filed, photos: readonly { id: string; sha256: string }[]): string {
  const { scope, extras, facts, record, result, signOff, rubricVersion, correction } = filed;
  const hashes = photos
    .map(({ id, sha256 }) => ({ id, sha256 }))
    .toSorted((a, b) => compareCodeUnits(a.id, b.id));
  const text = canonicalJson({
    facts,
    record,
    result,
    scope,
    extras: extras.toSorted(compareCodeUnits),
    signOff,
    rubricVersion,
    photos: hashes,
    correction,
  });
  return createHash('sha256').update(text, 'utf8').digest('hex');
}

/** Digits and letters that cannot be taken for one another when read aloud or off paper. */
const alphabet = '0123456789ABCDEFGHJKMNPQRSTVWXYZ';

/** The first forty bits of a digest in eight characters, `XXXX-XXXX`. */
export function checkCodeOf(digest: string): string {
  const bits = BigInt(`0x${digest.slice(0, 10)}`);
  const letters = Array.from({ length: 8 }, (_, index) =>
    alphabet.charAt(Number((bits >> BigInt(5 * (7 - index))) & 31n)),
  ).join('');
  return `${letters.slice(0, 4)}-${letters.slice(4)}`;
}

/** A code as somebody typed it, in the form it is kept; undefined if it cannot be one. */
export function readCheckCode(typed: string): string | undefined {
  const plain = typed
    .toUpperCase()
    .replaceAll(/[\s–—-]/g, '')
    .replaceAll('O', '0')
    .replaceAll(/[IL]/g, '1');
  return /^[0-9A-HJKMNP-TV-Z]{8}$/.test(plain) ? `${plain.slice(0, 4)}-${plain.slice(4)}` : undefined;
}
