import { useForm } from 'react-hook-form';
import { AppForm } from '#src/components/form/app-form.tsx';
import { TextField } from '#src/components/form/text-field.tsx';
import { PlainTable, type PlainColumn } from '#src/components/table/plain-table.tsx';
import { Button } from '#src/components/ui/button.tsx';
import { SectionHead } from '#src/components/ui/page-band.tsx';
import { counted, formatCount } from '#src/lib/formats.ts';
import { useCan } from '#src/lib/session/use-can.ts';
import type { Organisation } from '#shared/generated/api-types.ts';
import { useAddOrganisation } from '../api/people.ts';

const COLUMNS: readonly PlainColumn<Organisation>[] = [
  { id: 'name', title: 'Organisation', cell: (row) => <b>{row.name}</b> },
  { id: 'kind', title: 'Is', cell: (row) => (row.kind === 'owner' ? 'owner of the poles' : 'contractor') },
  { id: 'people', title: 'People', figures: true, cell: (row) => formatCount(row.people) },
];

/** The owner and its contractors; a contractor is added here before its people are invited. */
export function OrganisationList({ organisations }: { organisations: readonly Organisation[] }) {
  const add = useAddOrganisation();
  const mayAdd = useCan('create', 'Organisation');
  const form = useForm({ defaultValues: { name: '' } });
  return (
    <div className="mt-6 border-t border-hairline">
      <SectionHead title="Organisations" aside={counted(organisations.length, 'organisation')} />
      <PlainTable caption="Organisations" columns={COLUMNS} rows={organisations} rowKey={(row) => row.id} />
      {mayAdd ? (
        <div className="max-w-md px-gutter py-4">
          <AppForm
            form={form}
            label="Add a contractor"
            draftKey="organisation add"
            onSubmit={async ({ name }) => {
              await add({ name: name.trim() });
              form.reset();
            }}
          >
            <TextField
              name="name"
              label="Add a contractor"
              hint="Its name as on the contract."
              rules={{ validate: (text: string) => text.trim() !== '' || 'Write the name.' }}
            />
            <div>
              <Button type="submit" busy={form.formState.isSubmitting && 'Adding…'}>
                Add
              </Button>
            </div>
          </AppForm>
        </div>
      ) : null}
    </div>
  );
}
