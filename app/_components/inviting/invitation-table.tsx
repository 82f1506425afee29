import { sayWhen } from '@/components/progress/say-due';
import { ActionForm } from '@/components/ui/action-form';
import { Cell, ColumnName, HeadRow, Row, RowName, Table } from '@/components/ui/table';
import type { InvitationListed } from '@/lib/data/invitations';
import { sendAgain, withdraw } from './actions';

const states: Readonly<Record<InvitationListed['state'], string>> = {
  invited: 'invited',
  asked: 'came with the word, address not confirmed yet',
  expired: 'expired',
  joined: 'joined',
  withdrawn: 'withdrawn',
};

interface InvitationTableProps {
  readonly invitations: readonly InvitationListed[];
  readonly timeZone: string;
}

/** Who was invited, how it stands with each, and what can still be done. */
export function InvitationTable({ invitations, timeZone }: InvitationTableProps) {
  return (
    <Table caption="Who was invited">
      <HeadRow>
        <ColumnName>Who</ColumnName>
        <ColumnName>How it stands</ColumnName>
        <ColumnName>Letter</ColumnName>
        <ColumnName>
          <span className="sr-only">What can be done</span>
        </ColumnName>
      </HeadRow>
      <tbody>
        {invitations.map(({ invitationId, email, name, role, state, sentAt }) => (
          <Row key={invitationId}>
            <RowName className="min-w-48 break-all">
              {name ? <span className="block break-normal">{name}</span> : null}
              {email}
            </RowName>
            <Cell>
              {states[state]}
              {role === 'instructor' ? ', to teach' : ''}
            </Cell>
            <Cell className="whitespace-nowrap">{sayWhen(sentAt, timeZone)}</Cell>
            <Cell>
              {state === 'joined' || state === 'withdrawn' ? null : (
                <div className="flex flex-wrap gap-2">
                  <ActionForm
                    action={sendAgain.bind(null, invitationId)}
                    fields={[]}
                    submit="Send again"
                    variant="quiet"
                  />
                  <ActionForm
                    action={withdraw.bind(null, invitationId)}
                    fields={[]}
                    submit="Withdraw"
                    variant="quiet"
                  />
                </div>
              )}
            </Cell>
          </Row>
        ))}
      </tbody>
    </Table>
  );
}
