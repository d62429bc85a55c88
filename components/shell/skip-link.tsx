/** Id of the region that the skip link leads to. */
export const mainId = 'main';

/** The first Tab stop: past the navigation. A plain link, shown by base.css while focused. */
export function SkipLink() {
  return (
    <a href={`#${mainId}`} className="skip" onClick={skip}>
      Skip to the page
    </a>
  );
}

/** Moves the focus alone: the fragment of the address holds the state of the screen. */
function skip(event: React.MouseEvent) {
  event.preventDefault();
  document.getElementById(mainId)?.focus();
}
