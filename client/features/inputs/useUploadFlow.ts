import { useRef, useState } from 'react';

import type { ApiProblem } from '#shared/contracts/errors';
import type { EditableTable } from '#shared/contracts/tableColumns';
import type { UploadAnswer } from '#shared/contracts/tables';
import { readTable } from '#shared/csv/readTable';

import { sentenceOf } from '../../app/errorSentences.ts';
import { useUpload } from '../../data/mutations.ts';
import { columnSamples } from './columnSamples.ts';
import { guessTable, inTableOrder } from './guessTable.ts';

export type ColumnChoices = Readonly<Record<string, string | null>>;

/** Where one file stands. */
export type UploadState =
  | { readonly step: 'waiting' }
  /** the name did not say which table it is for */
  | { readonly step: 'which'; readonly file: File }
  | { readonly step: 'checking'; readonly file: File; readonly table: EditableTable }
  | { readonly step: 'ready'; readonly file: File; readonly table: EditableTable; readonly answer: UploadAnswer }
  | {
      readonly step: 'refused';
      readonly file: File;
      readonly table: EditableTable;
      readonly problems: readonly ApiProblem[];
      /** why, where no cell is to blame */
      readonly message: string | null;
    }
  | { readonly step: 'taken'; readonly file: File; readonly answer: UploadAnswer };

export type ReadColumns = UploadAnswer['columns'];

export interface UploadFlow {
  readonly state: UploadState;
  readonly columns: ReadColumns;
  /** a few values under each head of the file, in its order */
  readonly samples: readonly string[];
  /** rows of the file as read here, for the count in the words of a refusal */
  readonly rowCount: number;
  readonly waiting: readonly File[];
  readonly busy: boolean;
  readonly choose: (files: readonly File[]) => void;
  readonly setTable: (table: EditableTable) => void;
  readonly match: (header: string, column: string | null) => void;
  readonly take: () => void;
  readonly leave: () => void;
  readonly next: () => void;
}

const largestFile = 8 * 1024 * 1024;

/** The bytes of a file, or why there are none to look at. */
async function readBytes(file: File): Promise<Uint8Array | string> {
  if (file.size > largestFile) {
    return `${file.name} has ${(file.size / 1024 / 1024).toFixed(1)} MB, expected at most 8 MB. Upload the table alone, as CSV.`;
  }
  try {
    return new Uint8Array(await file.arrayBuffer());
  } catch {
    return `${file.name} can not be read any more; it was moved or changed since it was chosen. Choose it again.`;
  }
}

/** A file from choice to rows: read on both sides, tried without storing, then taken or left. */
export function useUploadFlow(
  buildingId: string,
  units: 'us' | 'si',
  onTaken: (table: EditableTable) => void,
): UploadFlow {
  const upload = useUpload(buildingId);
  const [state, setState] = useState<UploadState>({ step: 'waiting' });
  const [waiting, setWaiting] = useState<readonly File[]>([]);
  const [columns, setColumns] = useState<ReadColumns>([]);
  const [choices, setChoices] = useState<ColumnChoices>({});
  const [samples, setSamples] = useState<readonly string[]>([]);
  const [rowCount, setRowCount] = useState(0);
  /** a second click of a double click comes before the page has drawn the first */
  const taking = useRef(false);

  const check = async (file: File, table: EditableTable, wanted: ColumnChoices) => {
    setState({ step: 'checking', file, table });
    setChoices(wanted);
    const bytes = await readBytes(file);
    if (typeof bytes === 'string') {
      setState({ step: 'refused', file, table, problems: [], message: bytes });
      return;
    }
    const reading = readTable(table, bytes, file.name, units, wanted);
    setSamples(columnSamples(bytes, reading.delimiter));
    setColumns(reading.columns);
    setRowCount(reading.lines.length);
    const matched = Object.keys(wanted).length === 0 ? {} : { columns: wanted };
    upload.mutate(
      { file, table, dryRun: true, ...matched },
      {
        onSuccess: (answer) => setState({ step: 'ready', file, table, answer }),
        onError: (error) =>
          setState({
            step: 'refused',
            file,
            table,
            problems: error.problems,
            message: error.problems.length === 0 ? sentenceOf(error) : null,
          }),
      },
    );
  };

  const start = (file: File) => {
    const table = guessTable(file.name);
    setColumns([]);
    setChoices({});
    if (table === null) setState({ step: 'which', file });
    else void check(file, table, {});
  };

  return {
    state,
    columns,
    samples,
    rowCount,
    waiting,
    busy: upload.isPending,
    choose: (files) => {
      const [first, ...rest] = inTableOrder(files);
      if (first === undefined) return;
      setWaiting(rest);
      start(first);
    },
    setTable: (table) => {
      if ('file' in state) void check(state.file, table, {});
    },
    match: (header, column) => {
      if (state.step === 'refused' || state.step === 'ready') {
        void check(state.file, state.table, { ...choices, [header]: column });
      }
    },
    take: () => {
      if (state.step !== 'ready' || taking.current) return;
      taking.current = true;
      const { file, table } = state;
      const matched = Object.keys(choices).length === 0 ? {} : { columns: choices };
      upload.mutate(
        { file, table, dryRun: false, ...matched },
        {
          onSuccess: (answer) => {
            setState({ step: 'taken', file, answer });
            onTaken(table);
          },
          onSettled: () => {
            taking.current = false;
          },
          onError: (error) =>
            setState({
              step: 'refused',
              file,
              table,
              problems: error.problems,
              message: error.problems.length === 0 ? sentenceOf(error) : null,
            }),
        },
      );
    },
    leave: () => setState({ step: 'waiting' }),
    next: () => {
      const [first, ...rest] = waiting;
      setWaiting(rest);
      if (first === undefined) setState({ step: 'waiting' });
      else start(first);
    },
  };
}
