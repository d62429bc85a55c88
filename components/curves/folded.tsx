import type { ReactNode } from 'react';
import { Disclosure } from '../ui/disclosure';

/** More rows than this of one kind are behind one press. */
export const rowsAtMost = 8;

interface FoldedProps {
  readonly fold: boolean;
  readonly label: string;
  readonly children: ReactNode;
}

/** Rows of the read-out, behind one press where there are many. */
export const Folded = ({ fold, label, children }: FoldedProps) =>
  fold ? <Disclosure label={label}>{children}</Disclosure> : children;
