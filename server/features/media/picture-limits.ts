/** What a picture may be. The upload stands at 40 MB: a phone's largest photograph with room to spare. */
/** As phones and file managers count, and as the desk says it. */
export const megabyte = 1_000_000;
export const maxUploadBytes = 40 * megabyte;
export const maxPixels = 50_000_000;
export const maxSide = 12_000;
/** Widths made of every picture that is as wide. */
export const widthSteps: readonly number[] = [480, 960, 1600];
/** Everything kept of one build's pictures, in bytes. */
export const maxBuildBytes = 8000 * megabyte;
/** Pictures of one person that may wait to be made at the same time. */
export const maxWaiting = 40;
/** A 50 megapixel photograph takes about 10 s on one slow core. */
export const maxMakingMs = 60_000;

export function tooHeavyWords(bytes: number): string {
  const size = Math.max(Math.round(bytes / megabyte), maxUploadBytes / megabyte + 1);
  return `That file is ${size} MB; ${maxUploadBytes / megabyte} MB is the most.`;
}

export function tooBigWords(width: number, height: number): string {
  const side = (pixels: number) => pixels.toLocaleString('en-GB');
  return `That picture is ${side(width)} by ${side(height)} pixels. The most is ${maxPixels / 1_000_000} megapixels and ${side(maxSide)} pixels a side; save it smaller and try again.`;
}
