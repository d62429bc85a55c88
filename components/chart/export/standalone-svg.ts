const namespace = 'http://www.w3.org/2000/svg';

interface Caption {
  readonly title: string;
  /** Conditions, source: wrapped into lines under the figure. */
  readonly notes: readonly string[];
  readonly ink: string;
  readonly inkSoft: string;
  readonly page: string;
  readonly face: string;
  /** CSS with the faces that the figure uses. */
  readonly fonts: string;
}

const margin = 16;
const titleHeight = 40;
const noteHeight = 18;
/** Mean advance of the notes' face at their size, px. */
const noteAdvance = 6.4;

/** What the page's style sheet says about text, which a file of its own would lose. */
const textStyles = ['font-family', 'font-size', 'font-weight', 'font-style'] as const;

function copyTextStyles(from: SVGElement, to: SVGElement) {
  const sources = from.querySelectorAll<SVGElement>('text, tspan');
  const targets = to.querySelectorAll<SVGElement>('text, tspan');
  sources.forEach((source, i) => {
    const computed = getComputedStyle(source);
    for (const name of textStyles) targets[i]?.setAttribute(name, computed.getPropertyValue(name));
    targets[i]?.removeAttribute('class');
    targets[i]?.removeAttribute('style');
  });
}

/** Breaks a text into lines of at most `width` px, at blanks. */
function wrapped(text: string, width: number): string[] {
  const most = Math.floor(width / noteAdvance);
  return text.split(' ').reduce<string[]>((lines, word) => {
    const last = lines[lines.length - 1];
    const joined = last === undefined ? word : `${last} ${word}`;
    return last === undefined || joined.length > most
      ? [...lines, word]
      : [...lines.slice(0, -1), joined];
  }, []);
}

/** A figure on the screen as a file that stands alone: its title, its conditions, its fonts. */
export function standaloneSvg(figure: SVGSVGElement, caption: Caption) {
  const { width: inner, height: innerHeight } = figure.getBoundingClientRect();
  const width = Math.round(inner) + 2 * margin;
  const notes = caption.notes.flatMap((note) => wrapped(note, inner));
  const height = Math.round(innerHeight + titleHeight + notes.length * noteHeight + 2 * margin);
  const element = (name: string, attributes: Record<string, string | number>, text?: string) => {
    const made = document.createElementNS(namespace, name);
    for (const [key, value] of Object.entries(attributes)) made.setAttribute(key, String(value));
    if (text !== undefined) made.textContent = text;
    return made;
  };
  const line = (text: string, y: number, size: number, weight: number, fill: string) =>
    element(
      'text',
      { x: margin, y, 'font-family': caption.face, 'font-size': size, 'font-weight': weight, fill },
      text,
    );

  const root = element('svg', { width, height, viewBox: `0 0 ${width} ${height}` });
  const copy = figure.cloneNode(true) as SVGSVGElement;
  copyTextStyles(figure, copy);
  for (const name of ['class', 'style', 'aria-hidden']) copy.removeAttribute(name);
  copy.setAttribute('x', String(margin));
  copy.setAttribute('y', String(margin + titleHeight));
  root.append(
    element('title', {}, caption.title),
    element('style', {}, caption.fonts),
    element('rect', { width, height, fill: caption.page }),
    line(caption.title, margin + 18, 20, 600, caption.ink),
    copy,
    ...notes.map((note, i) =>
      line(
        note,
        margin + titleHeight + innerHeight + (i + 1) * noteHeight,
        12,
        400,
        caption.inkSoft,
      ),
    ),
  );
  return { width, height, markup: new XMLSerializer().serializeToString(root) };
}
