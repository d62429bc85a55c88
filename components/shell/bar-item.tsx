import type { ViewStyle } from 'react-native';
import { Icon, type IconName } from '../ui/icon';
import { space } from '../ui/theme';
import { Words } from '../ui/words';

/** Height of the bar in px, without what a phone's own bar takes below it. */
export const barHeight = 64;

interface BarItemProps {
  readonly icon: IconName;
  readonly label: string;
  readonly current: boolean;
}

/** Icon over word, as every slot of the bar shows itself. */
export function BarItem({ icon, label, current }: BarItemProps) {
  const tone = current ? 'well' : 'inkSoft';
  return (
    <>
      <Icon name={icon} size={24} tone={tone} />
      <Words kind="help" tone={tone} numberOfLines={1}>
        {label}
      </Words>
    </>
  );
}

/** One of the equal slots of the bar. */
export const barSlot: ViewStyle = {
  flexGrow: 1,
  flexBasis: 0,
  minWidth: 0,
  height: barHeight - 1,
  alignItems: 'center',
  justifyContent: 'center',
  gap: space[1],
  // The tread lies on the bar's own line.
  marginTop: -1,
  borderTopWidth: 3,
};
