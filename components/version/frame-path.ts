/** Where a frame's file is: the PNG a browser shows, the OpenEXR a compositor takes. */
export const framePath = (versionId: string, frame: number, kind: "png" | "exr"): string =>
  `/api/versions/${versionId}/frames/${frame}/${kind}`;

/** A small picture of a frame; 336 pixels where a screen draws two for one. */
export const thumbnailPath = (versionId: string, frame: number, width: 168 | 336 = 168): string =>
  `/api/versions/${versionId}/frames/${frame}/thumbnail?width=${width}`;
