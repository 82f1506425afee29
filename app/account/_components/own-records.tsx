import { PasswordGate } from '@/app/_components/password-gate';
import { buttonClass } from '@/components/ui/button';
import type { Viewer } from '@/lib/policy/viewer';

/** One's own records, to take away. */
export function OwnRecords({ viewer }: Readonly<{ viewer: Viewer }>) {
  return (
    <>
      <p className="mb-4 max-w-measure text-pencil">
        Everything that is kept of you: your profile, classes, rounds, attempts, pegs, comments,
        letters and sign-ins. An open round’s numbers follow once it is closed.
      </p>
      <PasswordGate viewer={viewer} name="records" purpose="take your records away">
        <div className="flex flex-wrap gap-3">
          <a
            href="/api/account/records"
            className={buttonClass('secondary')}
            download="hornbeam-records.json"
          >
            Everything, as JSON
          </a>
          <a
            href="/api/account/records?part=attempts"
            className={buttonClass('secondary')}
            download="hornbeam-attempts.csv"
          >
            Your attempts, as CSV
          </a>
        </div>
      </PasswordGate>
    </>
  );
}
