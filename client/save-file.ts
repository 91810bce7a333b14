/** Offers a text to be saved as a file by the browser. */
export function saveFile(text: string, fileName: string, mediaType: string): void {
  const address = URL.createObjectURL(new Blob([text], { type: mediaType }));
  const link = document.createElement('a');
  link.href = address;
  link.download = fileName;
  document.body.append(link);
  link.click();
  link.remove();
  // The download has begun once the click is handled.
  setTimeout(() => URL.revokeObjectURL(address), 10_000);
}
