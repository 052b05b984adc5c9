import type { DemoPerson } from '../server/modules/accounts/demo-people.service'

/** Invented people, one of each role. Their passphrases are printed at the start: they are for trying things out. */
export const demoPeople = [
  { name: 'Nettle Brine', email: 'member@example.org', password: 'a kettle of warm seawater', role: 'member' },
  { name: 'Quill Sounding', email: 'moderator@example.org', password: 'seven lamps above the sump', role: 'moderator' },
  { name: 'Plumb Harbour', email: 'admin@example.org', password: 'every ruler starts at zero', role: 'admin' },
] as const satisfies readonly DemoPerson[]
