import type { Log } from '#api/ctx.ts';

const nothing = () => undefined;
export const silentLog: Log = { debug: nothing, info: nothing, warn: nothing, error: nothing };

/** Keeps what was logged, for tests of the log itself. */
export function keptLog(): Log & { lines: { level: string; fields: object; message: string }[] } {
  const lines: { level: string; fields: object; message: string }[] = [];
  const keep = (level: string) => (fields: object, message: string) => {
    lines.push({ level, fields, message });
  };
  return { lines, debug: keep('debug'), info: keep('info'), warn: keep('warn'), error: keep('error') };
}
