import { type Action, can } from './permissions';

const rooms: { href: string; label: string; action: Action }[] = [
  { href: '/jobs', label: 'Jobs', action: 'job.read' },
  { href: '/machines', label: 'Machines', action: 'machine.read' },
  { href: '/instruments', label: 'Instruments', action: 'instrument.read' },
  { href: '/catalogue', label: 'Catalogue', action: 'member.list' },
  { href: '/archive', label: 'Archive', action: 'archive.search' },
];

const office: { href: string; label: string; action: Action }[] = [
  { href: '/customers', label: 'Customers', action: 'customer.list' },
  { href: '/team', label: 'Team', action: 'member.manage' },
  { href: '/settings', label: 'Letterhead and defaults', action: 'organisation.change' },
];

const open = (places: typeof rooms, roles: readonly string[]) =>
  places.filter(({ action }) => can(roles, action)).map(({ href, label }) => ({ href, label }));

/** The rooms in the header: customers have machines and the archive, staff all of them. */
export const roomsFor = (roles: readonly string[]) => open(rooms, roles);

/** What stands in the person's menu. */
export const officeFor = (roles: readonly string[]) => open(office, roles);
