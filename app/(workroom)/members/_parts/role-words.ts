import type { Role } from '@/db/permissions'

/** What each role is for, in the words of the trade. */
export const roleWords: Readonly<Record<Role, { readonly name: string; readonly does: string }>> = {
  owner: { name: 'Owner', does: 'Everything, and the members and settings of the workroom.' },
  drafter: { name: 'Drafter', does: 'Clients, their measure cards, and every draft.' },
  tutor: { name: 'Tutor', does: 'Own drafts and the teaching drafts of the workroom; no clients.' },
  maker: { name: 'Maker', does: 'Reads and prints the drafts given to them, with their client and card.' },
  student: { name: 'Student', does: 'Own measurements, own practice drafts, and lessons that are shared.' },
}
