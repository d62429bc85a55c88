import type { ReactNode } from 'react';
import { View } from 'react-native';
import type { FigureSave } from '../chart/export/use-figure-files';
import { requestCode, type WrittenRequest } from '../request/request-code';
import { aboutRequest, RequestView, useLanguage } from '../request/request-view';
import { Button } from '../ui/button';
import { Dialog } from '../ui/dialog';
import { space } from '../ui/theme';
import { useCopy } from '../ui/use-copy';
import { Words } from '../ui/words';
import { FileButtons } from './file-buttons';

interface ShareSheetProps {
  readonly open: boolean;
  readonly onClose: () => void;
  /** The address that shows this screen. */
  readonly link: string;
  readonly save: FigureSave;
  readonly numbers: string;
  /** Undefined while nothing can be asked. */
  readonly request: WrittenRequest | undefined;
  /** What the call gives: `this curve`. */
  readonly gives: string;
  /** Chooses the call, where there are several. */
  readonly which?: ReactNode;
}

/** All the ways a result leaves a phone: the link, files, the request. */
export function ShareSheet(props: ShareSheetProps) {
  const { open, onClose, link, save, numbers, request, gives, which } = props;
  const copy = useCopy();
  const [language, setLanguage] = useLanguage();
  return (
    <Dialog title="Share" open={open} onClose={onClose}>
      <View style={{ gap: space[4] }}>
        <Button
          kind="primary"
          size="main"
          icon="copy"
          label="Copy link"
          onPress={() => copy('Link', link)}
        />
        <FileButtons save={save} numbers={numbers} />
        {request && (
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
        )}
      </View>
    </Dialog>
  );
}
