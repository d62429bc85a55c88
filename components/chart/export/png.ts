/** A print at 25 cm wide wants about this many px for each one on the screen. */
const scale = 3;

interface Drawing {
  readonly width: number;
  readonly height: number;
  readonly markup: string;
}

/** A drawing as PNG. Throws where the browser cannot draw it. */
export async function pngOf({ width, height, markup }: Drawing): Promise<Blob> {
  const image = new Image();
  image.src = `data:image/svg+xml;charset=utf-8,${encodeURIComponent(markup)}`;
  await image.decode();
  const canvas = document.createElement('canvas');
  canvas.width = width * scale;
  canvas.height = height * scale;
  const context = canvas.getContext('2d');
  context?.drawImage(image, 0, 0, canvas.width, canvas.height);
  return new Promise((resolve, reject) =>
    canvas.toBlob((blob) => {
      if (blob) resolve(blob);
      else reject(new Error('The figure could not be drawn as PNG.'));
    }, 'image/png'),
  );
}
