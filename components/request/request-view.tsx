import { useId, useState } from 'react';
import { View } from 'react-native';
import { CodeBlock } from '../ui/code-block';
import { Tabs } from '../ui/tabs';
import type { Language, WrittenRequest } from './request-code';
import { languages, requestCode } from './request-code';

interface RequestViewProps {
  readonly request: WrittenRequest;
  readonly language: Language;
  readonly onLanguage: (language: Language) => void;
}

/** The request in one of the languages. */
export function RequestView({ request, language, onLanguage }: RequestViewProps) {
  const panel = useId();
  return (
    <View>
      <Tabs
        label="Language of the request"
        tabs={languages.map((key) => ({ key, label: key }))}
        current={language}
        onChange={onLanguage}
        panel={panel}
      />
      <View id={panel} role="tabpanel" aria-label={language}>
        <CodeBlock code={requestCode[language](request)} label={`The request in ${language}`} />
      </View>
    </View>
  );
}

/** What the code is, in words; `gives` says what for: `this curve`. */
export const aboutRequest = (gives: string) =>
  `The call that gives ${gives}. Put your key in the variable; it is never written here.`;

/** The language last looked at, for as long as the screen is open. */
export const useLanguage = () => useState<Language>('curl');
