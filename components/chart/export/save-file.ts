/** Hands a file to the reader's downloads. */
export function saveFile(name: string, content: Blob): void {
  const address = URL.createObjectURL(content);
  const link = document.createElement('a');
  link.href = address;
  link.download = name;
  link.click();
  // The download has read the address once the click's task is over.
  setTimeout(() => URL.revokeObjectURL(address));
}

/** A file name without what file systems refuse. */
export const fileName = (title: string, ending: string) =>
  `${title.replace(/[^\p{L}\p{N}]+/gu, '-').replace(/^-+|-+$/g, '') || 'curve'}.${ending}`;
