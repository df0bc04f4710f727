import { useState } from 'react';
import { useNavigate, useParams } from 'react-router-dom';
import { sitePaths } from '#shared/site-paths.ts';
import { CheckResult } from '#web/features/reports/check-result.tsx';
import { Button } from '#web/ui/button.tsx';
import { Field } from '#web/ui/field.tsx';
import { Page } from '#web/ui/page.tsx';

/** For whoever holds a copy: is it genuine, and how old is it. */
export function Component() {
  const { code } = useParams();
  const navigate = useNavigate();
  const [typed, setTyped] = useState(code ?? '');
  const [fault, setFault] = useState<string>();
  const letters = typed.replaceAll(/[\s–—-]/g, '');
  return (
    <Page
      title="Check a report"
      sub="Every report carries a check code of eight letters and digits in its title block."
      isNarrow
    >
      <form
        className="flex flex-wrap items-end gap-3"
        noValidate
        onSubmit={(event) => {
          event.preventDefault();
          if (letters.length !== 8) {
            setFault(`A code has eight letters and digits; this has ${String(letters.length)}`);
            return;
          }
          setFault(undefined);
          void navigate(sitePaths.checkCode(typed.trim()));
        }}
      >
        <div className="w-64">
          <Field label="Check code" hint="As printed, such as 7QF2-K9TD" error={fault}>
            {(control) => (
              <input
                {...control}
                value={typed}
                maxLength={20}
                autoCapitalize="characters"
                autoComplete="off"
                spellCheck={false}
                onChange={({ target }) => {
                  setTyped(target.value);
                }}
              />
            )}
          </Field>
        </div>
        <Button type="submit">Check it</Button>
      </form>
      {code !== undefined && (
        <div className="mt-8" aria-live="polite">
          <CheckResult key={code} code={code} />
        </div>
      )}
    </Page>
  );
}
