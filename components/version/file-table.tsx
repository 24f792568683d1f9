"use client";

import { useState } from "react";
import { sayBytes } from "@/lib/deliveries/schema-bytes";
import type { FileLine } from "@/lib/versions/schema";
import { requestJson } from "../api/request";
import { TextAction } from "../button/text-action";
import { Cell, FigureCell, HeadCell, Row, Table } from "../table/table";
import { framePath } from "./frame-path";

export interface FilePage {
  files: FileLine[];
  /** The frame the rest begins at; null at the end. */
  next: number | null;
}

/** Every file of the version with its length and checksum. A name takes the file. */
export function FileTable({ versionId, page }: { versionId: string; page: FilePage }) {
  const [later, setLater] = useState<FilePage[]>([]);
  const [refusal, setRefusal] = useState<string>();
  const files = [page, ...later].flatMap((one) => one.files);
  const { next } = later.at(-1) ?? page;
  const fetchMore = () =>
    requestJson<FilePage>(`/api/versions/${versionId}/files?from=${next}`).then(
      (more) => setLater([...later, more]),
      (error: Error) => setRefusal(error.message),
    );
  return (
    <section aria-labelledby="files">
      <h2 id="files" className="type-label section-line font-medium text-text">
        Files
      </h2>
      {files.length === 0 ? (
        <p className="type-label mt-8 text-soft">No frame is finished yet.</p>
      ) : (
        <div
          className="mt-8 max-h-480 overflow-y-auto"
          tabIndex={0}
          role="group"
          aria-label="Files of the version"
        >
          <Table aria-labelledby="files">
            <thead>
              <tr>
                <HeadCell>name</HeadCell>
                <HeadCell className="text-right">length</HeadCell>
                <HeadCell>SHA-256</HeadCell>
              </tr>
            </thead>
            <tbody>
              {files.map((file) => (
                <FileRow key={file.name} versionId={versionId} file={file} />
              ))}
            </tbody>
          </Table>
        </div>
      )}
      {next !== null && (
        <TextAction className="type-label mt-12" onClick={() => void fetchMore()}>
          The next frames’ files, from {next} on
        </TextAction>
      )}
      {refusal && <p className="type-label mt-8 text-ember">{refusal}</p>}
    </section>
  );
}

function FileRow({ versionId, file }: { versionId: string; file: FileLine }) {
  const { frame, kind, name, bytes, sha256 } = file;
  return (
    <Row>
      <Cell className="type-figure-small whitespace-nowrap">
        <a href={framePath(versionId, frame, kind)} download={name} className="action">
          {name}
        </a>
      </Cell>
      <FigureCell className="type-figure-small">{sayBytes(bytes)}</FigureCell>
      <Cell className="type-figure-small text-soft" title={sha256}>
        <span className="whitespace-nowrap 2xl:hidden">
          {sha256.slice(0, 8)} <span className="hidden sm:inline">{sha256.slice(8, 16)} </span>…{" "}
          {sha256.slice(-8)}
        </span>
        <span className="hidden 2xl:inline">{sha256}</span>
      </Cell>
    </Row>
  );
}
