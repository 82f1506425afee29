import { Button, ButtonLink } from '@/components/ui/button';
import { SelectField, TextField } from '@/components/ui/field';

interface FindPeopleProps {
  readonly search: string;
  readonly standing: string | undefined;
}

/** Looks for people by a part of their name or address, and by how they stand. */
export function FindPeople({ search, standing }: FindPeopleProps) {
  return (
    <form action="/people" className="mb-4 flex flex-wrap items-end gap-x-4">
      <div className="grow sm:max-w-80">
        <TextField
          label="Name or address"
          name="search"
          type="search"
          defaultValue={search}
          autoComplete="off"
        />
      </div>
      <div className="grow sm:max-w-60">
        <SelectField label="Who" name="standing" defaultValue={standing ?? ''}>
          <option value="">everybody</option>
          <option value="learner">learners</option>
          <option value="instructor">instructors</option>
          <option value="administrator">administrators</option>
          <option value="no password">no password yet</option>
          <option value="disabled">disabled</option>
        </SelectField>
      </div>
      <div className="mb-5 flex gap-3">
        <Button type="submit" variant="secondary">
          Find
        </Button>
        {search || standing ? (
          <ButtonLink href="/people" variant="quiet">
            Everybody
          </ButtonLink>
        ) : null}
      </div>
    </form>
  );
}
