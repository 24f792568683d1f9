"use client";

import { useState } from "react";
import { sayBytes } from "@/lib/deliveries/schema-bytes";
import type { DoorFile } from "@/lib/deliveries/schema-pages";
import { requestJson } from "../api/request";
import { TextAction } from "../button/text-action";
import { Message } from "../message/message";

const shown = 100;

/** The files one by one, asked for when they are wanted. */
export function SingleFiles({ delivery }: { delivery: string }) {
  const [files, setFiles] = useState<DoorFile[]>();
  const [limit, setLimit] = useState(shown);
  const [refusal, setRefusal] = useState<string>();
  const open = async () => {
    setRefusal(undefined);
    try {
      setFiles((await requestJson<{ files: DoorFile[] }>(`/api/deliveries/${delivery}/files`)).files);
    } catch (error) {
      setRefusal((error as Error).message);
    }
  };
  if (refusal)
    return (
      <Message kind="work" className="w-full">
        {refusal}
      </Message>
    );
  if (!files) return <TextAction onClick={() => void open()}>single files</TextAction>;
  return (
    <div className="w-full min-w-0">
      <TextAction onClick={() => setFiles(undefined)}>put the single files away</TextAction>
      <ul
        className="mt-12 max-h-480 overflow-y-auto border-y border-hair"
        tabIndex={0}
        aria-label="Single files"
      >
        {files.slice(0, limit).map(({ path, bytes }) => (
          <li
            key={path}
            className="flex items-baseline justify-between gap-12 border-b border-hair py-6 last:border-0"
          >
            <a
              href={`/api/deliveries/${delivery}/files/${path}`}
              download
              className="action type-figure-small min-w-0 break-all"
            >
              {path}
            </a>
            <span className="type-figure-small whitespace-nowrap text-soft">{sayBytes(bytes)}</span>
          </li>
        ))}
      </ul>
      {files.length > limit && (
        <TextAction className="mt-8" onClick={() => setLimit(limit + 10 * shown)}>
          show more of the {files.length} files
        </TextAction>
      )}
    </div>
  );
}
