/** Larger files are made smaller here before they are sent, bytes: reception at the field is poor. */
const LARGE = 3_000_000;
/** Longest side that is kept anyway, px. */
const LONGEST = 2400;
const QUALITY = 0.9;

/** The photo in the size in which it is kept; the file as it is where this browser cannot read it. */
export async function shrunk(file: File): Promise<Blob> {
  if (file.size <= LARGE) return file;
  try {
    const picture = await createImageBitmap(file);
    const scale = Math.min(1, LONGEST / Math.max(picture.width, picture.height));
    const canvas = document.createElement('canvas');
    canvas.width = Math.round(picture.width * scale);
    canvas.height = Math.round(picture.height * scale);
    canvas.getContext('2d')?.drawImage(picture, 0, 0, canvas.width, canvas.height);
    picture.close();
    const smaller = await new Promise<Blob | null>((resolve) =>
      canvas.toBlob(resolve, 'image/jpeg', QUALITY),
    );
    return smaller !== null && smaller.size < file.size ? smaller : file;
  } catch {
    return file;
  }
}
