import { Link } from 'react-router-dom'
import type { AdminPerson } from '#shared/schemas/people'
import { Button } from '../../../components/ui/button'
import { paths } from '../../../config/paths'
import { printDate } from '../../../lib/print-date'
import { roleNames } from '../role-names'

export interface PeopleTableProps {
  readonly people: readonly AdminPerson[]
  readonly onChange: (person: AdminPerson) => void
}

function describeStanding({ suspended, isConfirmed }: AdminPerson): string {
  if (suspended) return `Suspended since ${printDate(suspended.since)}: ${suspended.reason}`
  return isConfirmed ? 'Open' : 'Address not confirmed yet'
}

export function PeopleTable({ people, onChange }: PeopleTableProps) {
  return (
    <div className="relative overflow-x-auto" role="region" aria-label="People" tabIndex={0}>
      <table className="w-full border-collapse text-left">
        <caption className="sr-only">People by name, with role and standing</caption>
        <thead>
          <tr className="border-b-[1.5px] border-ink text-sm">
            {['Name', 'Role', 'Accepted', 'Since', 'Standing', 'Change'].map((title) => (
              <th key={title} scope="col" className="py-2 pr-4 font-semibold">
                {title}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {people.map((person) => (
            <tr key={person.name} className="border-b border-rule align-top">
              <th scope="row" className="min-w-44 py-2 pr-4 font-normal">
                <Link to={paths.person(person.name)} className="link inline-block min-h-6 font-semibold">
                  {person.name}
                </Link>
                <span className="block text-sm text-ink-soft">{person.email}</span>
              </th>
              <td className="py-2 pr-4">{roleNames[person.role]}</td>
              <td className="py-2 pr-4 font-mono tabular-nums">{person.acceptedRevisions}</td>
              <td className="py-2 pr-4 whitespace-nowrap">{printDate(person.since)}</td>
              <td className="min-w-40 py-2 pr-4">{describeStanding(person)}</td>
              <td className="py-2">
                {person.can.changeRole ? (
                  <div className="flex flex-wrap items-center gap-3">
                    <Button size="sm" aria-label={`Change ${person.name}`} onClick={() => onChange(person)}>
                      Change
                    </Button>
                    {person.acceptedRevisions > 0 && (
                      <Link to={paths.revertPerson(person.name)} className="link inline-block min-h-6 text-sm">
                        Revert<span className="sr-only"> what {person.name} changed</span>
                      </Link>
                    )}
                  </div>
                ) : (
                  <span className="text-sm text-ink-soft">You</span>
                )}
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  )
}
