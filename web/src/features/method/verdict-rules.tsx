import type { MethodData } from '#shared/surveys/method.ts';
import { VerdictMark } from '#web/ui/verdict-mark.tsx';

/** The rules in the order they are tried, under the verdict each gives. */
export function VerdictRules({ method }: { method: MethodData }) {
  const worstFirst = method.verdicts.toReversed();
  return (
    <ol className="grid gap-6">
      {worstFirst.map(({ id }) => {
        const rules = method.verdictRules.filter(({ verdict }) => verdict === id);
        return (
          <li key={id}>
            <h3>
              <VerdictMark verdict={id} />
            </h3>
            {rules.length === 0 ? (
              <p className="mt-1">Where no rule above fires.</p>
            ) : (
              <ul className="mt-1 border-t border-rule">
                {rules.map((rule) => (
                  <li
                    key={rule.id}
                    className="grid gap-x-8 border-b border-rule py-2 md:grid-cols-[minmax(0,1fr)_minmax(0,1fr)]"
                  >
                    <span>{rule.title}</span>
                    <span className="text-sm leading-6 text-pencil">{rule.why}</span>
                  </li>
                ))}
              </ul>
            )}
          </li>
        );
      })}
    </ol>
  );
}
