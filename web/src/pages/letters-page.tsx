import { useSuspenseQuery } from '@tanstack/react-query';
import { accountQueries } from '#web/features/accounts/queries.ts';
import { formatBytes, formatInstant } from '#web/lib/format.ts';
import { Button } from '#web/ui/button.tsx';
import { Disclosure } from '#web/ui/disclosure.tsx';
import { Empty } from '#web/ui/notes.tsx';
import { Page } from '#web/ui/page.tsx';

/** Links in a letter open here; the rest stays text. */
function LetterText({ text }: { text: string }) {
  return (
    <p className="whitespace-pre-line">
      {text.split(/(https?:\/\/\S+)/).map((part, index) =>
        index % 2 === 1 ? (
          <a key={part} className="link break-all" href={part}>
            {part}
          </a>
        ) : (
          part
        ),
      )}
    </p>
  );
}

export function Component() {
  const { data, refetch, isFetching } = useSuspenseQuery(accountQueries.letters());
  return (
    <Page
      title="Letters"
      sub="Everything this demonstration has sent by e-mail, newest first. A live site sends it to the people themselves and shows it to nobody."
      aside={
        <Button kind="quiet" isPending={isFetching} onClick={() => void refetch()}>
          Look again
        </Button>
      }
    >
      {data.items.length === 0 ? (
        <Empty title="No letters yet">Commission a survey, or join with a new address, and one comes.</Empty>
      ) : (
        <ul className="border-t border-rule">
          {data.items.map(({ id, to, subject, sentAt, text, attachments }) => (
            <li key={id}>
              <Disclosure
                summary={
                  <>
                    {subject}{' '}
                    <span className="font-normal text-pencil">
                      to {to}, {formatInstant(sentAt)}
                    </span>
                  </>
                }
              >
                <LetterText text={text} />
                {attachments.length > 0 && (
                  <p className="mt-2 text-sm text-pencil">
                    With it:{' '}
                    {attachments
                      .map(({ filename, bytes }) => `${filename} (${formatBytes(bytes)})`)
                      .join(', ')}
                  </p>
                )}
              </Disclosure>
            </li>
          ))}
        </ul>
      )}
    </Page>
  );
}
