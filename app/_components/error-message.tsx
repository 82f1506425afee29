import { Button, ButtonLink } from '@/components/ui/button';
import { Page } from '@/components/ui/page';
import { PageHeading } from '@/components/ui/page-heading';

interface ErrorMessageProps {
  /** The id under which the server wrote down what happened. */
  readonly id?: string | undefined;
  readonly onRetry: () => void;
}

/** Says that something broke, what was kept, and what to do. */
export function ErrorMessage({ id, onRetry }: ErrorMessageProps) {
  return (
    <Page width="narrow">
      <PageHeading>Something broke on our side</PageHeading>
      <p className="mb-3 max-w-measure">
        This page could not be made. Answers that you have sent are kept, and answers that were
        still waiting on this device wait on.
      </p>
      <p className="mb-6 max-w-measure">
        Try once more. If it happens again, tell whoever looks after Hornbeam in your workshop
        {id ? (
          <>
            {' '}
            and give them this number: <span className="font-mono font-semibold">{id}</span>
          </>
        ) : null}
        .
      </p>
      <div className="flex flex-wrap gap-3">
        <Button onClick={onRetry}>Try again</Button>
        <ButtonLink href="/" variant="secondary">
          Go to the front page
        </ButtonLink>
      </div>
    </Page>
  );
}
