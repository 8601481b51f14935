import type { ErrorCode } from '#contracts/errors.ts';

// What the site and its picture process say to each other.

/** Make the files of one picture. */
export interface PictureOrder {
  readonly id: number;
  /** The upload, in quarantine. */
  readonly source: string;
  /** Where the files are written first; on the same disk as `folder`. */
  readonly making: string;
  /** Where they stand once all are there. */
  readonly folder: string;
}

export interface MadePicture {
  readonly width: number;
  readonly height: number;
  readonly widths: number[];
  readonly placeholder: string;
  /** ISO time, or nothing where the camera did not say. */
  readonly takenAt: string | null;
  /** All files together. */
  readonly bytes: number;
}

/** Something the uploader can mend. */
export interface PictureRefusal {
  readonly code: Extract<ErrorCode, 'bad-input' | 'wrong-type' | 'too-large'>;
  readonly problem: string;
}

export type PictureAnswer =
  | { readonly id: number; readonly kind: 'made'; readonly picture: MadePicture; readonly resident: number }
  | { readonly id: number; readonly kind: 'refused'; readonly refusal: PictureRefusal; readonly resident: number }
  | { readonly id: number; readonly kind: 'fault'; readonly fault: string; readonly resident: number };

/** Thrown while a picture is read; told to the uploader. */
export class RefusedPicture extends Error {
  readonly refusal: PictureRefusal;
  constructor(code: PictureRefusal['code'], problem: string) {
    super(problem);
    this.name = 'RefusedPicture';
    this.refusal = { code, problem };
  }
}
