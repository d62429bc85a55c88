import type { IconName } from '../ui/icon';

/** A place of the app and the question it answers. */
export interface Place {
  readonly href: '/' | '/api' | '/notes';
  readonly label: string;
  readonly question: string;
  readonly icon: IconName;
}

/** In the order of the bar and the rail. */
export const places: readonly Place[] = [
  {
    href: '/',
    label: 'Curves',
    question: 'What forms are present at this pH?',
    icon: 'curves',
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
