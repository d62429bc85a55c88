const dataUri = async (font: Response) => {
  const bytes = new Uint8Array(await font.arrayBuffer());
  const binary = Array.from(bytes, (byte) => String.fromCharCode(byte)).join('');
  return `data:font/woff2;base64,${btoa(binary)}`;
};

const faces = () =>
  Array.from(document.styleSheets)
    .flatMap((sheet) => Array.from(sheet.cssRules))
    .filter((rule) => rule instanceof CSSFontFaceRule);

/**
 * The page's font faces as CSS that needs no other file, so that a drawing looks the same wherever
 * it is opened. Faces that cannot be fetched now (offline) are left out: the reader's own stand in.
 */
export async function embeddedFonts(): Promise<string> {
  const rules = await Promise.all(
    faces().map(async ({ style, parentStyleSheet }) => {
      const source = /url\("?([^")]+)"?\)/.exec(style.getPropertyValue('src'))?.[1];
      if (!source) return '';
      const address = new URL(source, parentStyleSheet?.href ?? document.baseURI);
      const font = await fetch(address).catch(() => undefined);
      if (!font?.ok) return '';
      const [family, weight, slant] = ['font-family', 'font-weight', 'font-style'].map((name) =>
        style.getPropertyValue(name),
      );
      const src = `url(${await dataUri(font)}) format("woff2")`;
      return `@font-face{font-family:${family};font-weight:${weight};font-style:${slant};src:${src}}`;
    }),
  );
  return rules.join('\n');
}
