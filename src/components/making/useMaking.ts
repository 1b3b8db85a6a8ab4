import { useCallback, useEffect, useMemo, useRef, useState } from 'react';
import { ApiError } from '../../client/api';
import { getMaking, sendMarks } from '../../client/queries/making';
import type { MakingOrder } from '../../lib/joining/makingOrder';
import { mergeMarks } from '../../lib/making/mergeMarks';
import { KEPT_LIMITS } from '../../schemas/limits';
import type { Making, MakingInput, MakingWeighingInput } from '../../schemas/making';
import {
  deviceKey,
  NO_MARKS,
  readMarks,
  withoutSent,
  writeMarks,
  type DeviceMarks,
} from './deviceMarks';

/** Other devices are asked after so long, and an unreachable server is tried again. */
const ASK_AGAIN_MS = 15_000;

export type SendState =
  | { readonly is: 'sent' }
  | { readonly is: 'sending' }
  | { readonly is: 'offline' }
  | { readonly is: 'refused'; readonly why: string };

export interface MakingState {
  readonly order: MakingOrder;
  readonly made: ReadonlySet<string>;
  readonly weighings: readonly MakingWeighingInput[];
  readonly state: SendState;
  /** Marks that only this device has so far. */
  readonly unsent: number;
  readonly tick: (motif: string, done: boolean) => void;
  readonly weigh: (weighings: readonly Omit<MakingWeighingInput, 'at'>[]) => void;
  readonly setOrder: (order: MakingOrder) => void;
}

const marksIn = ({ ticks, weighings, order }: MakingInput): number =>
  ticks.length + weighings.length + (order ? 1 : 0);

/**
 * The making of a blanket as this device and all others have it. A mark is kept on the device at
 * once and sent when the server can be reached; what other devices marked comes in on the way.
 */
export function useMaking(blanketId: string, initial: Making): MakingState {
  const [device, setDevice] = useState<DeviceMarks>({ unsent: NO_MARKS, seen: initial });
  const [state, setState] = useState<SendState>({ is: 'sent' });
  const current = useRef(device);
  const sending = useRef(false);

  /** The storage is read anew for every change: another tab may have written to it. */
  const update = useCallback(
    (change: (stored: DeviceMarks) => DeviceMarks) => {
      const stored = readMarks(blanketId);
      const known = current.current;
      const next = change({
        unsent: mergeUnsent(stored.unsent, known.unsent),
        seen: known.seen ?? stored.seen,
      });
      writeMarks(blanketId, next);
      current.current = next;
      setDevice(next);
    },
    [blanketId],
  );

  const send = useCallback(async () => {
    if (sending.current) return;
    sending.current = true;
    setState((old) => (old.is === 'offline' ? old : { is: 'sending' }));
    try {
      do {
        const marks = firstOf(current.current.unsent);
        const seen =
          marksIn(marks) > 0 ? await sendMarks(blanketId, marks) : await getMaking(blanketId);
        current.current = {
          ...current.current,
          unsent: withoutSent(current.current.unsent, marks),
        };
        removeSent(blanketId, marks);
        update(({ unsent }) => ({ unsent, seen }));
      } while (marksIn(current.current.unsent) > 0);
      setState({ is: 'sent' });
    } catch (error) {
      setState(
        error instanceof ApiError && error.status >= 400 && error.status < 500
          ? { is: 'refused', why: error.message }
          : { is: 'offline' },
      );
    } finally {
      sending.current = false;
    }
  }, [blanketId, update]);

  useEffect(() => {
    const stored = readMarks(blanketId);
    update(({ unsent }) => ({ unsent, seen: laterOf(initial, stored.seen) }));
    void send();
    const again = () => document.visibilityState === 'visible' && void send();
    const timer = setInterval(again, ASK_AGAIN_MS);
    const onStorage = ({ key }: StorageEvent) =>
      key === deviceKey(blanketId) && update((both) => both);
    window.addEventListener('online', again);
    document.addEventListener('visibilitychange', again);
    window.addEventListener('storage', onStorage);
    return () => {
      clearInterval(timer);
      window.removeEventListener('online', again);
      document.removeEventListener('visibilitychange', again);
      window.removeEventListener('storage', onStorage);
    };
  }, [blanketId, initial, send, update]);

  const mark = useCallback(
    (marks: Partial<MakingInput>) => {
      update(({ unsent, seen }) => ({
        seen,
        unsent: mergeUnsent(unsent, { ...NO_MARKS, ...marks }),
      }));
      void send();
    },
    [send, update],
  );
  const tick = useCallback(
    (motif: string, done: boolean) => mark({ ticks: [{ motif, done, at: nowText() }] }),
    [mark],
  );
  const weigh = useCallback(
    (weighings: readonly Omit<MakingWeighingInput, 'at'>[]) => {
      // One after the other: what was begun with comes before what is left.
      const start = Date.now() - weighings.length;
      mark({
        weighings: weighings.map((each, i) => ({
          ...each,
          at: new Date(start + i).toISOString(),
        })),
      });
    },
    [mark],
  );
  const setOrder = useCallback(
    (order: MakingOrder) => mark({ order: { order, at: nowText() } }),
    [mark],
  );

  const merged = useMemo(() => {
    const { ticks, weighings } = mergeMarks(device.seen ?? initial, device.unsent);
    return {
      made: new Set(ticks.flatMap(({ motif, done }) => (done ? [motif] : []))),
      weighings: weighings.filter(({ gone }) => !gone),
    };
  }, [device, initial]);
  return {
    ...merged,
    order: device.unsent.order?.order ?? device.seen?.order ?? initial.order,
    state,
    unsent: marksIn(device.unsent),
    tick,
    weigh,
    setOrder,
  };
}

const nowText = (): string => new Date().toISOString();

function mergeUnsent(one: MakingInput, other: MakingInput): MakingInput {
  const merged = mergeMarks(one, other);
  const later = (one.order?.at ?? '') > (other.order?.at ?? '') ? one.order : other.order;
  return { ticks: [...merged.ticks], weighings: [...merged.weighings], order: later ?? one.order };
}

/** As many marks as one request may carry. */
const firstOf = ({ ticks, weighings, order }: MakingInput): MakingInput => ({
  ticks: ticks.slice(0, KEPT_LIMITS.ticksAtOnce),
  weighings,
  order,
});

function removeSent(blanketId: string, sent: MakingInput): void {
  const stored = readMarks(blanketId);
  writeMarks(blanketId, { ...stored, unsent: withoutSent(stored.unsent, sent) });
}

/** A page kept for offline use brings the state of the day it was kept; the device may know more. */
function laterOf(page: Making, stored: Making | null): Making {
  if (!stored) return page;
  return { ...page, ...mergeMarks(page, stored) } as Making;
}
