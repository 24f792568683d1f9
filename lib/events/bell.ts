/** A wait that can be cut short; a ring while nobody waits is kept for the next wait. */
export interface Bell {
  ring(): void;
  wait(milliseconds: number): Promise<void>;
}

export function makeBell(): Bell {
  let rung = false;
  let wake: (() => void) | undefined;
  return {
    ring() {
      rung = true;
      wake?.();
    },
    async wait(milliseconds) {
      if (!rung)
        await new Promise<void>((resolve) => {
          const timer = setTimeout(resolve, milliseconds);
          wake = () => (clearTimeout(timer), resolve());
        });
      rung = false;
      wake = undefined;
    },
  };
}
