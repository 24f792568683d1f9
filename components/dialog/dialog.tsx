"use client";

import { Dialog as Radix } from "radix-ui";
import type { ReactNode } from "react";

export interface DialogProps {
  /** The element that opens it; a Button or TextAction. Absent when `open` is controlled. */
  trigger?: ReactNode;
  open?: boolean;
  onOpenChange?: (open: boolean) => void;
  /** A sentence that asks, or says what this is. */
  title: ReactNode;
  /** What will follow. */
  description?: ReactNode;
  children?: ReactNode;
}

/** A sheet laid over the page for one decision. Escape and the last word close it. */
export function Dialog({ trigger, open, onOpenChange, title, description, children }: DialogProps) {
  return (
    <Radix.Root open={open} onOpenChange={onOpenChange}>
      {trigger && <Radix.Trigger asChild>{trigger}</Radix.Trigger>}
      <Radix.Portal>
        <Radix.Overlay className="fixed inset-0 z-40 bg-sunk opacity-80" />
        <Radix.Content
          {...(description ? {} : { "aria-describedby": undefined })}
          className="fixed top-1/2 left-1/2 z-50 grid max-h-[90vh] w-560 max-w-[calc(100vw-32px)] -translate-1/2 gap-16 overflow-y-auto rounded border border-edge bg-ground p-24 text-text outline-none"
        >
          <Radix.Title className="type-heading">{title}</Radix.Title>
          {description && (
            <Radix.Description className="type-body text-soft">{description}</Radix.Description>
          )}
          {children}
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  );
}

/** Closes the dialog it stands in; wraps a Button or TextAction. */
export function DialogClose({ children }: { children: ReactNode }) {
  return <Radix.Close asChild>{children}</Radix.Close>;
}
