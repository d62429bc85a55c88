import type { Role } from '../../shared/scopes';
import type { IconName } from '../ui/icon';

/** A place of the app and the question it answers. */
export interface Place {
  readonly href: '/' | '/mixture' | '/systems' | '/keys' | '/api' | '/notes';
  readonly label: string;
  readonly question: string;
  readonly icon: IconName;
  /** Who finds it among the places; without it everybody, signed in or not. */
  readonly roles?: readonly Role[];
}

/** In the order of the bar and the rail. */
const places: readonly Place[] = [
  {
    href: '/',
    label: 'Curves',
    question: 'What forms are present at this pH?',
    icon: 'curves',
  },
  {
    href: '/mixture',
    label: 'Mixture',
    question: 'What will the pH be?',
    icon: 'mixture',
  },
  {
    href: '/systems',
    label: 'Systems',
    question: 'Which constants do we use, from where?',
    icon: 'systems',
  },
  {
    href: '/keys',
    label: 'Keys',
    question: 'Who calls us, and how do I stop one?',
    icon: 'key',
    roles: ['admin', 'developer'],
  },
  {
    href: '/api',
    label: 'API',
    question: 'How do I call this from a pipeline?',
    icon: 'code',
  },
  {
    href: '/notes',
    label: 'Notes',
    question: 'What are these numbers worth?',
    icon: 'notes',
  },
];

/** Whether an address is that of a place or of a page within it. */
export const isWithin = ({ href }: Place, pathname: string) =>
  pathname === href || pathname.startsWith(`${href}/`);

/** The places of somebody in this role, or of nobody in particular. */
export const placesOf = (role: Role | undefined): readonly Place[] =>
  places.filter(({ roles }) => roles === undefined || (role !== undefined && roles.includes(role)));

/** Places on a phone's bar; its last slot holds the account and the places that find no room. */
const onBar = 4;

/** What the bar shows itself, and what stands behind its last slot. */
export const barPlaces = (all: readonly Place[]) => ({
  shown: all.slice(0, onBar),
  behind: all.slice(onBar),
});
