import { useQueryClient, useSuspenseQuery } from '@tanstack/react-query';
import { useCallback, useState } from 'react';
import { Link, useNavigate, useParams, useSearchParams } from 'react-router-dom';
import type { FieldError } from '#shared/problem.ts';
import { sitePaths } from '#shared/site-paths.ts';
import { useSignedIn } from '#web/features/accounts/use-me.ts';
import { listingQueries } from '#web/features/listings/queries.ts';
import { sellSteps } from '#web/features/listings/sell-steps.ts';
import { StepDeclaration } from '#web/features/listings/step-declaration.tsx';
import { StepFittings } from '#web/features/listings/step-fittings.tsx';
import { StepHistory } from '#web/features/listings/step-history.tsx';
import { StepList } from '#web/features/listings/step-list.tsx';
import { StepPhotographs } from '#web/features/listings/step-photographs.tsx';
import { StepPlace } from '#web/features/listings/step-place.tsx';
import { StepSizes } from '#web/features/listings/step-sizes.tsx';
import { StepWhat } from '#web/features/listings/step-what.tsx';
import { useDraft } from '#web/features/listings/use-draft.ts';
import type { SaveState } from '#web/features/listings/use-draft.ts';
import { useDeleteDocument } from '#web/features/listings/photo-queries.ts';
import { Button } from '#web/ui/button.tsx';
import { Notice } from '#web/ui/notes.tsx';
import { Page } from '#web/ui/page.tsx';

const stateWords: Record<SaveState, string> = {
  saved: 'Saved',
  waiting: 'Not saved yet',
  saving: 'Saving…',
  failed: 'Not saved',
  stale: 'Changed elsewhere',
};

export function Component() {
  useSignedIn();
  const { id = '' } = useParams();
  const client = useQueryClient();
  const navigate = useNavigate();
  const [search] = useSearchParams();
  const { data: listing } = useSuspenseQuery(listingQueries.ownDetail(id));
  const { draft, change, save, state, problem } = useDraft(listing);
  const [errors, setErrors] = useState<readonly FieldError[]>([]);
  const removeDocument = useDeleteDocument(id);
  const at = Math.max(
    0,
    sellSteps.findIndex((step) => step.id === search.get('step')),
  );
  const step = sellSteps[at] ?? sellSteps[0];
  const next = sellSteps[at + 1];
  const refresh = useCallback(
    () => void client.invalidateQueries({ queryKey: listingQueries.ownDetail(id).queryKey }),
    [client, id],
  );
  const props = { draft, onChange: change, errors };

  return (
    <Page
      title={listing.status === 'draft' ? 'List a boiler' : 'Edit the listing'}
      crumbs={[{ label: 'Sell', to: sitePaths.sellStart }, { label: draft.title || 'Draft' }]}
      aside={<output className="text-sm text-pencil">{stateWords[state]}</output>}
    >
      <div className="grid gap-8 lg:grid-cols-[14rem_minmax(0,44rem)]">
        <nav aria-label="Steps">
          <ol className="grid grid-cols-2 gap-x-6 border-b border-rule pb-2 sm:grid-cols-4 lg:grid-cols-1 lg:border-0">
            {sellSteps.map(({ id: stepId, label }, index) => (
              <li key={stepId}>
                <Link
                  to={`?step=${stepId}`}
                  aria-current={stepId === step.id ? 'step' : undefined}
                  className={`flex min-h-11 items-center gap-2 border-l-3 pl-2 text-[0.9375rem] leading-5 ${stepId === step.id ? 'border-copper font-medium' : 'border-transparent text-pencil'}`}
                >
                  {index + 1}. {label}
                </Link>
              </li>
            ))}
          </ol>
        </nav>
        <div>
          {(state === 'failed' || state === 'stale') && (
            <div className="mb-6">
              <Notice kind="bad">
                {problem}{' '}
                {state === 'failed' ? (
                  <Button kind="plain" onClick={() => void save()}>
                    Save now
                  </Button>
                ) : (
                  <Button
                    kind="plain"
                    onClick={() => {
                      window.location.reload();
                    }}
                  >
                    Show the newer version
                  </Button>
                )}
              </Notice>
            </div>
          )}
          <h2 className="mb-4">{step.label}</h2>
          {step.id === 'what' && <StepWhat {...props} />}
          {step.id === 'sizes' && <StepSizes {...props} />}
          {step.id === 'fittings' && <StepFittings {...props} />}
          {step.id === 'history' && (
            <StepHistory
              {...props}
              listingId={id}
              documents={listing.documents}
              onUploaded={refresh}
              onRemoveDocument={(documentId) => {
                removeDocument.mutate(documentId);
              }}
            />
          )}
          {step.id === 'photographs' && <StepPhotographs {...props} listing={listing} onUploaded={refresh} />}
          {step.id === 'declaration' && <StepDeclaration {...props} />}
          {step.id === 'place' && <StepPlace {...props} town={listing.town} />}
          {step.id === 'list' && (
            <StepList
              draft={draft}
              listing={listing}
              save={save}
              onErrors={setErrors}
              onListed={(slug) => void navigate(sitePaths.listing(slug))}
              onDiscarded={() => void navigate(sitePaths.sellStart)}
            />
          )}
          {next && (
            <p className="mt-8 border-t border-rule pt-4">
              <Button
                onClick={() => {
                  void save();
                  void navigate(`?step=${next.id}`);
                }}
              >
                Next: {next.label.toLowerCase()}
              </Button>
            </p>
          )}
        </div>
      </div>
    </Page>
  );
}
