import { ShareSheet } from '../leaving/share-sheet';
import { linkTo } from './use-address';
import type { Curves } from './use-curves';
import { numbersHeld, type Exports } from './use-exports';
import { useScreenRequest } from './use-screen-request';

interface ShareDialogProps {
  readonly open: boolean;
  readonly onClose: () => void;
  readonly curves: Curves;
  readonly exports: Exports;
}

/** All the ways a curve leaves a phone: the link, files, the request. */
export function ShareDialog({ open, onClose, curves, exports }: ShareDialogProps) {
  return (
    <ShareSheet
      open={open}
      onClose={onClose}
      link={linkTo(curves.state)}
      save={exports.save}
      numbers={numbersHeld}
      {...useScreenRequest(curves)}
    />
  );
}
