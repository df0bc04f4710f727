import { useEffect, useRef, useState } from 'react';
import type { ReactNode } from 'react';
import { materials } from '#shared/boilers/boiler.ts';
import type { MaterialId } from '#shared/boilers/boiler.ts';
import { boilerTypeIds, boilerTypeOf } from '#shared/boilers/boiler-types.ts';
import { invalidInput, Problem } from '#shared/problem.ts';
import type { FieldError } from '#shared/problem.ts';
import { feeBands } from '#shared/survey-orders/pricing.ts';
import { surveyorTerms } from '#shared/surveyors/contract.ts';
import type { SurveyorTerms } from '#shared/surveyors/contract.ts';
import { extras, scopes } from '#shared/surveys/scopes.ts';
import type { ExtraId, ScopeId } from '#shared/surveys/scopes.ts';
import { formatPence } from '#web/lib/format.ts';
import { messageOf } from '#web/lib/form-problem.ts';
import { Button } from '#web/ui/button.tsx';
import { Check } from '#web/ui/check.tsx';
import { Field, FieldGroup } from '#web/ui/field.tsx';
import { Notice } from '#web/ui/notes.tsx';
import { MoneyInput, QuantityInput } from '#web/ui/quantity-input.tsx';
import { useSaveTerms } from './queries.ts';

type Draft = Omit<SurveyorTerms, 'townId' | 'rangeKm' | 'fees'> & {
  townId: number | null;
  rangeKm: number | null;
  fees: Record<keyof SurveyorTerms['fees'], number | null>;
};

const empty: Draft = {
  townId: null,
  rangeKm: null,
  types: [],
  materials: [],
  insuredUntilOn: '',
  fees: { external: null, hydraulic: null, full: null, thickness: null, borescope: null, perKmMinor: null },
  about: '',
  isTakingJobs: true,
};

const bandWords = (id: ScopeId | ExtraId): string =>
  `${formatPence(feeBands[id].lowMinor)} to ${formatPence(feeBands[id].highMinor)}`;

const toggled = <T extends string>(list: readonly T[], id: T, isOn: boolean): T[] =>
  isOn ? [...list, id] : list.filter((each) => each !== id);

interface Props {
  terms: SurveyorTerms | null;
  /** The box for the town, which knows the gazetteer. */
  townInput: (onChoose: (townId: number) => void, error: string | undefined) => ReactNode;
}

/** Particulars of a surveyor. All mistakes are shown at once, beside their fields. */
export function TermsForm({ terms, townInput }: Props) {
  const save = useSaveTerms();
  const [draft, setDraft] = useState<Draft>(terms ?? empty);
  const [errors, setErrors] = useState<readonly FieldError[]>([]);
  const form = useRef<HTMLFormElement>(null);
  useEffect(() => {
    if (errors.length > 0)
      form.current
        ?.querySelector<HTMLElement>('[aria-invalid="true"], [aria-describedby$="-error"] input')
        ?.focus();
  }, [errors]);
  const at = (pointer: string): string | undefined =>
    errors.find((error) => error.pointer === pointer)?.detail;
  const set = (change: Partial<Draft>) => {
    setDraft({ ...draft, ...change });
    if (save.isSuccess) save.reset();
  };
  const setFee = (id: keyof Draft['fees'], minor: number | null) => {
    set({ fees: { ...draft.fees, [id]: minor } });
  };
  const submit = () => {
    const parsed = surveyorTerms.safeParse(draft);
    if (!parsed.success) {
      setErrors(invalidInput(parsed.error).errors);
      return;
    }
    setErrors([]);
    save.mutate(parsed.data, {
      onError: (error) => {
        if (error instanceof Problem) setErrors(error.errors);
      },
    });
  };
  return (
    <form
      ref={form}
      noValidate
      className="grid gap-8"
      onSubmit={(event) => {
        event.preventDefault();
        submit();
      }}
    >
      <div className="grid gap-6 sm:grid-cols-2">
        {townInput((townId) => {
          set({ townId });
        }, at('#/townId'))}
        <QuantityInput
          label="How far you go, one way"
          hint="As the crow flies"
          quantity="distance"
          value={draft.rangeKm}
          error={at('#/rangeKm')}
          onChange={(km) => {
            set({ rangeKm: km === null ? null : Math.round(km) });
          }}
        />
      </div>
      <FieldGroup legend="Types you are competent to survey" error={at('#/types')}>
        <div className="grid gap-x-8 sm:grid-cols-2">
          {boilerTypeIds.map((id) => (
            <Check
              key={id}
              label={boilerTypeOf(id).label}
              checked={draft.types.includes(id)}
              onChange={(event) => {
                set({ types: toggled(draft.types, id, event.target.checked) });
              }}
            />
          ))}
        </div>
      </FieldGroup>
      <FieldGroup legend="Materials" error={at('#/materials')}>
        <div className="grid gap-x-8 sm:grid-cols-2">
          {(Object.keys(materials) as MaterialId[]).map((id) => (
            <Check
              key={id}
              label={materials[id]}
              checked={draft.materials.includes(id)}
              onChange={(event) => {
                set({ materials: toggled(draft.materials, id, event.target.checked) });
              }}
            />
          ))}
        </div>
      </FieldGroup>
      <FieldGroup
        legend="Fees"
        hint="Yours to set within the platform’s bands. Leave an extra empty if you do not offer it."
      >
        <div className="grid gap-6 sm:grid-cols-2">
          {(Object.keys(scopes) as ScopeId[]).map((id) => (
            <MoneyInput
              key={id}
              label={scopes[id].label}
              hint={bandWords(id)}
              value={draft.fees[id]}
              error={at(`#/fees/${id}`)}
              onChange={(minor) => {
                setFee(id, minor);
              }}
            />
          ))}
          {(Object.keys(extras) as ExtraId[]).map((id) => (
            <MoneyInput
              key={id}
              label={extras[id].label}
              hint={`${bandWords(id)}, or empty`}
              value={draft.fees[id]}
              error={at(`#/fees/${id}`)}
              onChange={(minor) => {
                setFee(id, minor);
              }}
            />
          ))}
          <MoneyInput
            label="Travel, for each kilometre"
            hint="There and back are counted"
            value={draft.fees.perKmMinor}
            error={at('#/fees/perKmMinor')}
            onChange={(minor) => {
              setFee('perKmMinor', minor);
            }}
          />
        </div>
      </FieldGroup>
      <Field
        label="Insured until"
        hint="New jobs stop by themselves on that day"
        error={at('#/insuredUntilOn')}
      >
        {(control) => (
          <input
            {...control}
            type="date"
            value={draft.insuredUntilOn}
            onChange={(event) => {
              set({ insuredUntilOn: event.target.value });
            }}
          />
        )}
      </Field>
      <Field
        label="About you"
        hint="What you have built, tested and for whom; what you bring"
        error={at('#/about')}
      >
        {(control) => (
          <textarea
            {...control}
            rows={5}
            maxLength={1_500}
            value={draft.about}
            onChange={(event) => {
              set({ about: event.target.value });
            }}
          />
        )}
      </Field>
      <Check
        label="I am taking jobs"
        checked={draft.isTakingJobs}
        onChange={(event) => {
          set({ isTakingJobs: event.target.checked });
        }}
      />
      {errors.length > 0 && <Notice kind="bad">Not saved: some entries need mending; each says what.</Notice>}
      {save.isError && errors.length === 0 && <Notice kind="bad">{messageOf(save.error)}</Notice>}
      <div className="flex items-center gap-4">
        <Button type="submit" isPending={save.isPending}>
          Save
        </Button>
        {save.isSuccess && <output>Saved</output>}
      </div>
    </form>
  );
}
