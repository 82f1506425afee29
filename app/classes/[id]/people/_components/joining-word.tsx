import { ActionForm } from '@/components/ui/action-form';
import type { ClassFound } from '@/lib/data/classes';
import { letJoin, renewWord } from '../actions';

/** The word by which people join by themselves: what it is, whether it is open, and a new one. */
export function JoiningWord({ found }: Readonly<{ found: ClassFound }>) {
  const { classId, joiningWord, joiningOpen } = found;
  if (joiningWord === null) {
    return (
      <>
        <p className="mb-4 max-w-measure">
          With a joining word people come into the class by themselves: they type it at{' '}
          <span className="font-mono">/join</span> and confirm their address. It works while you
          keep it open.
        </p>
        <ActionForm
          action={renewWord.bind(null, classId)}
          fields={[]}
          submit="Make a joining word"
          variant="secondary"
        />
      </>
    );
  }
  return (
    <>
      <p className="mb-2 rounded border border-rule bg-board px-4 py-3 text-center font-mono text-xl break-all select-all">
        {joiningWord}
      </p>
      <p className="mb-4">
        <strong className={joiningOpen ? 'text-leaf' : 'text-madder'}>
          <span aria-hidden="true">{joiningOpen ? '✓ ' : '✕ '}</span>
          {joiningOpen ? 'Open' : 'Closed'}
        </strong>{' '}
        {joiningOpen
          ? 'Whoever types it at /join and confirms their address is in the class as a learner.'
          : 'Nobody can join with it until you open it.'}
      </p>
      <div className="flex flex-wrap gap-3">
        <ActionForm
          key={String(joiningOpen)}
          action={letJoin.bind(null, classId, !joiningOpen)}
          fields={[]}
          submit={joiningOpen ? 'Close joining' : 'Open joining'}
          variant="secondary"
        />
        <ActionForm
          action={renewWord.bind(null, classId)}
          fields={[]}
          submit="Make a new word"
          variant="quiet"
        />
      </div>
    </>
  );
}
