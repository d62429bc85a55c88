import { View } from 'react-native';
import { Button } from '../ui/button';
import { Dialog } from '../ui/dialog';
import { space } from '../ui/theme';
import { Words } from '../ui/words';
import { ExportButtons } from './export-buttons';
import { requestCode } from '../request/request-code';
import { aboutRequest, RequestView, useLanguage } from '../request/request-view';
import { linkTo } from './use-address';
import { useCopy } from '../ui/use-copy';
import type { Curves } from './use-curves';
import type { Exports } from './use-exports';
import { useScreenRequest } from './use-screen-request';

interface ShareDialogProps {
  readonly open: boolean;
  readonly onClose: () => void;
  readonly curves: Curves;
  readonly exports: Exports;
}

/** All the ways a curve leaves a phone: the link, files, the request. */
export function ShareDialog({ open, onClose, curves, exports }: ShareDialogProps) {
  const copy = useCopy();
  const [language, setLanguage] = useLanguage();
  const { request, gives, which } = useScreenRequest(curves);
  return (
    <Dialog title="Share" open={open} onClose={onClose}>
      <View style={{ gap: space[4] }}>
        <Button
          kind="primary"
          size="main"
          icon="copy"
          label="Copy link"
          onPress={() => copy('Link', linkTo(curves.state))}
        />
        <ExportButtons {...exports} />
        <View style={{ gap: space[2] }}>
          <Words kind="section" heading={3}>
            The request
          </Words>
          <Words kind="help">{aboutRequest(gives)}</Words>
          {which}
          <RequestView request={request} language={language} onLanguage={setLanguage} />
          <Button
            icon="copy"
            label={`Copy the ${language} request`}
            onPress={() => copy(`Request in ${language}`, requestCode[language](request))}
          />
        </View>
      </View>
    </Dialog>
  );
}
