import { lazy, Suspense } from 'react';
import { paperKinds } from '#shared/boilers/boiler.ts';
import type { DocumentView } from '#shared/listings/pictures.ts';
import { Button } from '#web/ui/button.tsx';
import { Check } from '#web/ui/check.tsx';
import { Field, FieldGroup } from '#web/ui/field.tsx';
import { Loading } from '#web/ui/mark.tsx';
import { Select } from '#web/ui/select.tsx';
import { errorAt } from './sell-steps.ts';
import { withFacts } from './step-props.ts';
import type { StepProps } from './step-props.ts';

const Uploader = lazy(async () => ({
  default: (await import('./uploader.tsx')).Uploader,
}));

function Papers({ draft, onChange, errors }: StepProps) {
  const { papers } = draft.facts;
  const set = (next: typeof papers) => {
    onChange(withFacts(draft, { papers: next }));
  };
  return (
    <FieldGroup
      legend="Papers"
      hint="Certificates, drawings, receipts: what exists, whether or not you attach it."
    >
      {papers.map((paper, index) => (
        <div
          key={index}
          className="grid gap-4 border-t border-rule pt-4 sm:grid-cols-[2fr_1fr_2fr_auto] sm:items-end"
        >
          <Select
            label="Kind"
            value={paper.kind}
            options={paperKinds}
            onChange={(kind) => {
              if (kind !== null) set(papers.with(index, { ...paper, kind }));
            }}
          />
          <Field label="Date on it" error={errorAt(errors, `#/facts/papers/${String(index)}/datedOn`)}>
            {(control) => (
              <input
                {...control}
                type="date"
                value={paper.datedOn ?? ''}
                onChange={(event) => {
                  set(
                    papers.with(index, {
                      ...paper,
                      datedOn: event.target.value === '' ? null : event.target.value,
                    }),
                  );
                }}
              />
            )}
          </Field>
          <Field label="By whom">
            {(control) => (
              <input
                {...control}
                maxLength={120}
                value={paper.by}
                onChange={(event) => {
                  set(papers.with(index, { ...paper, by: event.target.value }));
                }}
              />
            )}
          </Field>
          <Button
            kind="plain"
            aria-label={`Remove paper ${String(index + 1)}`}
            onClick={() => {
              set(papers.toSpliced(index, 1));
            }}
          >
            Remove
          </Button>
        </div>
      ))}
      <div>
        <Button
          kind="quiet"
          disabled={papers.length >= 20}
          onClick={() => {
            set([...papers, { kind: 'hydraulic-certificate', datedOn: null, by: '' }]);
          }}
        >
          Add a paper
        </Button>
      </div>
    </FieldGroup>
  );
}

function History({ draft, onChange, errors, documents }: StepProps & { documents: readonly DocumentView[] }) {
  const { history } = draft;
  const set = (next: typeof history) => {
    onChange({ ...draft, history: next });
  };
  return (
    <FieldGroup
      legend="History"
      hint="One line for each thing that happened. A year is enough: 1998, or 1998-04."
    >
      {history.map((entry, index) => (
        <div
          key={entry.id}
          className="grid gap-4 border-t border-rule pt-4 sm:grid-cols-[8rem_1fr_auto] sm:items-end"
        >
          <Field label="When" error={errorAt(errors, `#/history/${String(index)}/when`)}>
            {(control) => (
              <input
                {...control}
                maxLength={10}
                value={entry.when}
                onChange={(event) => {
                  set(history.with(index, { ...entry, when: event.target.value.trim() }));
                }}
              />
            )}
          </Field>
          <Field label="What happened" error={errorAt(errors, `#/history/${String(index)}/text`)}>
            {(control) => (
              <input
                {...control}
                maxLength={600}
                value={entry.text}
                onChange={(event) => {
                  set(history.with(index, { ...entry, text: event.target.value }));
                }}
              />
            )}
          </Field>
          <Button
            kind="plain"
            aria-label={`Remove entry ${String(index + 1)}`}
            onClick={() => {
              set(history.toSpliced(index, 1));
            }}
          >
            Remove
          </Button>
          {documents.length > 0 && (
            <div className="sm:col-span-3">
              <p className="text-label text-pencil">Documents that show it</p>
              <div className="flex flex-wrap gap-x-6">
                {documents.map(({ id, filename }) => (
                  <Check
                    key={id}
                    label={filename}
                    checked={entry.documentIds.includes(id)}
                    onChange={(event) => {
                      const rest = entry.documentIds.filter((each) => each !== id);
                      set(
                        history.with(index, {
                          ...entry,
                          documentIds: event.target.checked ? [...rest, id] : rest,
                        }),
                      );
                    }}
                  />
                ))}
              </div>
            </div>
          )}
        </div>
      ))}
      <div>
        <Button
          kind="quiet"
          disabled={history.length >= 40}
          onClick={() => {
            set([...history, { id: crypto.randomUUID(), when: '', text: '', documentIds: [] }]);
          }}
        >
          Add to the history
        </Button>
      </div>
    </FieldGroup>
  );
}

/** Papers, the boiler's history, and the documents that show it. */
export function StepHistory(
  props: StepProps & {
    listingId: string;
    documents: readonly DocumentView[];
    onUploaded: () => void;
    onRemoveDocument: (id: string) => void;
  },
) {
  const { listingId, documents, onUploaded, onRemoveDocument } = props;
  return (
    <div className="grid gap-10">
      <Papers {...props} />
      <History {...props} />
      <FieldGroup
        legend="Documents"
        hint="PDF, JPEG or PNG, up to 15 MB each. Signed-in members can read them; cover names and addresses you would not publish."
      >
        {documents.length > 0 && (
          <ul className="divide-y divide-rule border-y border-rule">
            {documents.map(({ id, filename }) => (
              <li key={id} className="flex items-center justify-between gap-4 py-1">
                <a className="link" href={`/api/documents/${id}`}>
                  {filename}
                </a>
                <Button
                  kind="plain"
                  aria-label={`Remove ${filename}`}
                  onClick={() => {
                    onRemoveDocument(id);
                  }}
                >
                  Remove
                </Button>
              </li>
            ))}
          </ul>
        )}
        <Suspense fallback={<Loading what="Getting the uploader ready" />}>
          <Uploader purpose="listing-document" recordId={listingId} view="document" onUploaded={onUploaded} />
        </Suspense>
      </FieldGroup>
    </div>
  );
}
