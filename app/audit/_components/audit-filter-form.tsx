import { Button, ButtonLink } from '@/components/ui/button';
import { SelectField, TextField } from '@/components/ui/field';
import type { AuditFilter } from '@/lib/data/audit-log';

interface AuditFilterFormProps {
  readonly filter: AuditFilter;
  readonly choices: {
    readonly actions: readonly string[];
    readonly objectKinds: readonly string[];
    readonly classes: readonly { readonly classId: string; readonly name: string }[];
  };
}

const grid = 'grid gap-x-4 sm:grid-cols-2 lg:grid-cols-3';

/** Looks for lines by person, by what was done to what, by class and by day. */
export function AuditFilterForm({ filter, choices }: AuditFilterFormProps) {
  return (
    <form action="/audit" className="mb-6 print:hidden">
      <div className={grid}>
        <TextField
          label="Person"
          name="person"
          type="search"
          defaultValue={filter.person}
          autoComplete="off"
          hint="Who did it, or whom it is about: part of a name or an address."
        />
        <Choice
          name="action"
          label="What was done"
          options={choices.actions}
          value={filter.action}
        />
        <Choice
          name="objectKind"
          label="To what"
          options={choices.objectKinds}
          value={filter.objectKind}
        />
        <SelectField label="Class" name="classId" defaultValue={filter.classId ?? ''}>
          <option value="">any or none</option>
          {choices.classes.map(({ classId, name }) => (
            <option key={classId} value={classId}>
              {name}
            </option>
          ))}
        </SelectField>
        <TextField label="From" name="from" type="date" defaultValue={filter.from} />
        <TextField label="To" name="to" type="date" defaultValue={filter.to} />
      </div>
      <div className="flex gap-3">
        <Button type="submit" variant="secondary">
          Find
        </Button>
        <ButtonLink href="/audit" variant="quiet">
          Everything
        </ButtonLink>
      </div>
    </form>
  );
}

function Choice({
  name,
  label,
  options,
  value,
}: Readonly<{
  name: string;
  label: string;
  options: readonly string[];
  value: string | undefined;
}>) {
  return (
    <SelectField label={label} name={name} defaultValue={value ?? ''}>
      <option value="">anything</option>
      {options.map((option) => (
        <option key={option} value={option}>
          {option}
        </option>
      ))}
    </SelectField>
  );
}
