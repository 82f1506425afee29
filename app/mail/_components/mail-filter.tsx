import Link from 'next/link';
import { Button } from '@/components/ui/button';
import { SelectField, TextField } from '@/components/ui/field';
import { letterKinds } from '@/lib/mail/letter';
import { letterStates, type MailFilter as Filter } from '@/lib/schemas/mail';
import { kindWords, stateWords } from './words';

/** Narrows the log down; what is chosen stands in the address, so that it can be kept. */
export function MailFilter({ filter }: Readonly<{ filter: Filter }>) {
  return (
    <form
      action="/mail"
      className="mb-6 grid gap-x-5 sm:grid-cols-2 lg:grid-cols-[1fr_1fr_2fr_auto] lg:items-start"
    >
      <SelectField name="state" label="State" defaultValue={filter.state ?? ''}>
        <option value="">All</option>
        {letterStates.map((state) => (
          <option key={state} value={state}>
            {stateWords[state].word}
          </option>
        ))}
      </SelectField>
      <SelectField name="kind" label="Kind" defaultValue={filter.kind}>
        <option value="">All</option>
        {letterKinds.map((kind) => (
          <option key={kind} value={kind}>
            {kindWords[kind]}
          </option>
        ))}
      </SelectField>
      <TextField
        name="address"
        label="Address, or part of it"
        defaultValue={filter.address}
        autoComplete="off"
        type="search"
      />
      <div className="flex items-center gap-4 lg:pt-7">
        <Button type="submit" variant="secondary">
          Show
        </Button>
        <Link href="/mail" prefetch={false} className="link link-target">
          Everything
        </Link>
      </div>
    </form>
  );
}
