import { sayWhen } from '@/components/progress/say-due';
import { ActionForm } from '@/components/ui/action-form';
import { Cell, ColumnName, HeadRow, Row, RowName, Table } from '@/components/ui/table';
import { listOwnSessions } from '@/lib/data/own-sessions';
import type { Viewer } from '@/lib/policy/viewer';
import { endSession, signOutEverywhere } from '../session-actions';
import { deviceWords } from './device-words';

/** Where somebody is signed in, and the ways to end it. */
export async function OwnSessions({ viewer }: Readonly<{ viewer: Viewer }>) {
  const sessions = await listOwnSessions(viewer);
  return (
    <>
      <Table caption="Where you are signed in">
        <HeadRow>
          <ColumnName>Device</ColumnName>
          <ColumnName>Signed in</ColumnName>
          <ColumnName>Last here</ColumnName>
          <ColumnName>
            <span className="sr-only">End it</span>
          </ColumnName>
        </HeadRow>
        <tbody>
          {sessions.map(({ sessionId, device, signedInAt, lastSeenAt, here }) => (
            <Row key={sessionId}>
              <RowName>{deviceWords(device)}</RowName>
              <Cell>{sayWhen(signedInAt, viewer.timeZone)}</Cell>
              <Cell>{here ? 'this one, now' : sayWhen(lastSeenAt, viewer.timeZone)}</Cell>
              <Cell>
                {here ? null : (
                  <ActionForm
                    action={endSession.bind(null, sessionId)}
                    fields={[]}
                    submit="End it"
                    variant="quiet"
                  />
                )}
              </Cell>
            </Row>
          ))}
        </tbody>
      </Table>
      <div className="mt-5">
        <ActionForm
          action={signOutEverywhere}
          fields={[]}
          submit="Sign out everywhere"
          variant="secondary"
        >
          <input type="hidden" name="sure" value="yes" />
        </ActionForm>
      </div>
    </>
  );
}
