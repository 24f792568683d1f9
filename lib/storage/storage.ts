import { environment } from "../environment";
import { bucketStorage } from "./bucket";
import { folderStorage } from "./folder";
import type { Storage } from "./stored-file";

let chosen: Storage | undefined;

/** The process's storage: an S3 bucket when one is configured, else the local folder. */
export function storage(): Storage {
  return (chosen ??= choose());
}

function choose(): Storage {
  const { S3_BUCKET: bucket, S3_ENDPOINT: endpoint, S3_REGION: region, STORAGE_DIR: folder } = environment();
  return bucket ? bucketStorage({ bucket, endpoint, region }) : folderStorage(folder);
}
