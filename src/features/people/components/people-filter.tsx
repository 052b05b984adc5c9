import { Form } from 'react-router-dom'
import { Button } from '../../../components/ui/button'
import { SelectField } from '../../../components/ui/select-field'
import { TextField } from '../../../components/ui/text-field'
import { roleNames } from '../role-names'

const roleOptions = Object.entries(roleNames).map(([value, label]) => ({ value, label }))

/** A plain form: what is looked for is in the address. */
export function PeopleFilter({ search }: { readonly search: URLSearchParams }) {
  return (
    <Form key={search.toString()} method="get" role="search" className="mt-6 grid items-end gap-4 sm:grid-cols-4">
      <TextField id="people-q" name="q" label="Name or address" type="search" defaultValue={search.get('q') ?? ''} />
      <SelectField
        id="people-role"
        name="role"
        label="Role"
        emptyLabel="any"
        options={roleOptions}
        defaultValue={search.get('role') ?? ''}
      />
      <SelectField
        id="people-standing"
        name="standing"
        label="Standing"
        emptyLabel="any"
        options={[{ value: 'suspended', label: 'Suspended' }]}
        defaultValue={search.get('standing') ?? ''}
      />
      <Button type="submit">Look</Button>
    </Form>
  )
}
