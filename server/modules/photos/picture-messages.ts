/** What the decoding process is asked and answers; paths are in a folder that both see. */
export type PictureRequest = { readonly source: string; readonly thumb: string; readonly display: string };

export type PictureFacts = {
  readonly type: string;
  /** Pixels as shown, turned by the camera's own mark. */
  readonly width: number;
  readonly height: number;
  /** Wall clock of the camera, `YYYY-MM-DDTHH:mm:ss`; null when the picture does not say. */
  readonly takenWall: string | null;
  /** Instant in ISO form where the picture also says its offset from UTC. */
  readonly takenAt: string | null;
  /** WGS 84 degrees. */
  readonly latitude: number | null;
  readonly longitude: number | null;
};

export type PictureAnswer =
  | { readonly type: 'facts'; readonly facts: PictureFacts }
  | { readonly type: 'problem'; readonly code: string; readonly detail: string };
