import { Empty } from '@/components/ui/panel';
import { Cell, ColumnName, HeadRow, Row, RowName, Table } from '@/components/ui/table';
import type { ItemFigures } from '@/lib/data/sticking-points';

const percent = (share: number) => `${Math.round(share * 100)} %`;

/** How each exercise did by first attempts, where there are enough to say. */
export function Items({ items }: Readonly<{ items: readonly ItemFigures[] }>) {
  if (items.length === 0) {
    return (
      <Empty title="No answer yet">The first answers of your learners are counted here.</Empty>
    );
  }
  return (
    <Table caption="How each exercise did">
      <HeadRow>
        <ColumnName>Exercise</ColumnName>
        <ColumnName>First attempts</ColumnName>
        <ColumnName>Right</ColumnName>
        <ColumnName>Likely between</ColumnName>
        <ColumnName>Goes with the rest</ColumnName>
      </HeadRow>
      <tbody>
        {items.map(({ exerciseId, title, n, tooFew, shareRight, from, to, itemRest }) => (
          <Row key={exerciseId}>
            <RowName>{title}</RowName>
            <Cell className="font-mono">{n}</Cell>
            {tooFew ? (
              <Cell colSpan={3} className="text-pencil">
                too few to say
              </Cell>
            ) : (
              <>
                <Cell className="font-mono">{percent(shareRight)}</Cell>
                <Cell className="font-mono whitespace-nowrap">
                  {percent(from)} – {percent(to)}
                </Cell>
                <Cell className="font-mono">{itemRest === null ? '–' : itemRest.toFixed(2)}</Cell>
              </>
            )}
          </Row>
        ))}
      </tbody>
    </Table>
  );
}
