import { useRef, useState, type DragEvent, type ReactNode } from 'react';

import { editableTables, type EditableTable } from '#shared/contracts/tableColumns';
import type { UploadAnswer } from '#shared/contracts/tables';

import { Button } from '../../components/ui/Button.tsx';
import { ColumnMatching } from './ColumnMatching.tsx';
import { ProblemList } from './ProblemList.tsx';
import { rowNames, tabNames } from './tabNames.ts';
import { UploadPreview } from './UploadPreview.tsx';
import type { UploadFlow } from './useUploadFlow.ts';

export interface UploadPanelProps {
  readonly flow: UploadFlow;
  readonly units: 'us' | 'si';
  readonly onClose: () => void;
}

const count = (value: number): string => value.toLocaleString('en-US');

function changeWords({ added, removed, changed, same }: UploadAnswer['changes']): string {
  const parts = [
    added > 0 ? `${count(added)} added` : '',
    changed > 0 ? `${count(changed)} changed` : '',
    removed > 0 ? `${count(removed)} taken out` : '',
    same > 0 ? `${count(same)} as they are` : '',
  ].filter((part) => part !== '');
  return parts.length === 0 ? 'nothing changes' : parts.join(', ');
}

function Notices({ notices }: { readonly notices: readonly string[] }) {
  return notices.length === 0 ? null : (
    <ul className="mt-2">
      {notices.map((notice, index) => (
        <li key={index} className="border-t border-rule py-1 first:border-t-0">
          {notice}
        </li>
      ))}
    </ul>
  );
}

function TableChoice({ table, onChoose }: { table: EditableTable | null; onChoose: (table: EditableTable) => void }) {
  return (
    <label className="gw-label mt-3 flex items-center gap-2">
      Table
      <select
        className="gw-input gw-input-low w-[180px]!"
        value={table ?? ''}
        onChange={(event) => {
          const chosen = editableTables.find((one) => one === event.target.value);
          if (chosen !== undefined) onChoose(chosen);
        }}
      >
        {table === null ? <option value="">choose a table</option> : null}
        {editableTables.map((one) => (
          <option key={one} value={one}>
            {tabNames[one]}
          </option>
        ))}
      </select>
    </label>
  );
}

/** The place where a file is dropped or chosen, and all that is said of it before anything is stored. */
export function UploadPanel({ flow, units, onClose }: UploadPanelProps) {
  const { state } = flow;
  const field = useRef<HTMLInputElement>(null);
  const [over, setOver] = useState(false);
  const pick = () => field.current?.click();

  const title = {
    waiting: 'Upload a table',
    which: 'Which table is this',
    checking: 'file' in state ? `Reading ${state.file.name}` : '',
    ready: 'file' in state ? `${state.file.name} can be taken` : '',
    refused: 'file' in state ? `${state.file.name} was not taken` : '',
    taken: 'file' in state ? `${state.file.name} is stored` : '',
  }[state.step];

  const more =
    flow.waiting.length === 0 ? null : (
      <span className="note">
        {flow.waiting.length === 1 ? '1 more file waits' : `${flow.waiting.length} more files wait`}
      </span>
    );

  let body: ReactNode;
  if (state.step === 'waiting') {
    body = (
      <>
        <p className="my-2">
          A CSV file with a row of heads; units in brackets convert, as in <span className="gw-code">height (ft)</span>.
          What it would change is shown before anything is stored.
        </p>
        <div
          className={`flex flex-col items-center gap-3 border border-dashed px-4 py-5 ${over ? 'border-ink bg-well' : 'border-line'}`}
          onDragOver={(event: DragEvent) => {
            event.preventDefault();
            setOver(true);
          }}
          onDragLeave={() => setOver(false)}
        >
          <span>Drop levels, walls, forces, gravity or combinations here</span>
          <Button look="primary" onClick={pick}>
            Choose a file
          </Button>
        </div>
      </>
    );
  } else if (state.step === 'which') {
    body = (
      <>
        <p className="mt-2">
          The name <span className="gw-code">{state.file.name}</span> does not say which table it holds.
        </p>
        <TableChoice table={null} onChoose={flow.setTable} />
      </>
    );
  } else if (state.step === 'checking') {
    body = <p className="mt-2 text-graphite">Read against the tables that are stored. Nothing is stored yet.</p>;
  } else if (state.step === 'taken') {
    body = (
      <>
        <p className="mt-2">
          {tabNames[state.answer.table]}: {changeWords(state.answer.changes)}. <kbd>Ctrl</kbd> <kbd>Z</kbd> in the grid
          takes it back.
        </p>
        <Notices notices={state.answer.notices} />
        <div className="mt-3 flex items-center gap-2">
          {flow.waiting.length > 0 ? (
            <Button look="primary" onClick={flow.next}>
              Read the next file
            </Button>
          ) : (
            <Button onClick={pick}>Choose another file</Button>
          )}
          {more}
        </div>
      </>
    );
  } else if (state.step === 'ready') {
    const { answer } = state;
    body = (
      <>
        <p className="mt-2">
          {count(answer.rows.length)} {rowNames[state.table].many}. Compared with what is stored:{' '}
          <b className="font-semibold">{changeWords(answer.changes)}</b>.
        </p>
        <Notices notices={answer.notices} />
        <div className="mt-3 flex items-center gap-2">
          <Button look="primary" onClick={flow.take} aria-disabled={flow.busy}>
            Take it
          </Button>
          <Button onClick={flow.leave}>Leave it</Button>
          {more}
        </div>
        <TableChoice table={state.table} onChoose={flow.setTable} />
        <UploadPreview table={state.table} answer={answer} units={units} />
        <ColumnMatching
          table={state.table}
          columns={flow.columns}
          samples={flow.samples}
          disabled={flow.busy}
          onMatch={flow.match}
        />
      </>
    );
  } else {
    const { problems } = state;
    body = (
      <>
        <p className="my-2" role="alert">
          {state.message ??
            `${problems.length === 1 ? '1 problem' : `${count(problems.length)} problems`}${flow.rowCount === 0 ? '' : ` in ${count(flow.rowCount)} rows`}. What is stored now stays as it is. Correct the file and upload it again, or match a column below.`}
        </p>
        <ProblemList problems={problems} />
        <div className="mt-3 flex items-center gap-2">
          <Button look="primary" onClick={pick}>
            Choose the corrected file
          </Button>
          <Button onClick={flow.leave}>Leave it</Button>
          {more}
        </div>
        <TableChoice table={state.table} onChoose={flow.setTable} />
        {flow.columns.length === 0 ? null : (
          <ColumnMatching
            table={state.table}
            columns={flow.columns}
            samples={flow.samples}
            disabled={flow.busy}
            onMatch={flow.match}
          />
        )}
      </>
    );
  }

  return (
    <section
      aria-label="Upload"
      className="min-w-0"
      onDragOver={(event) => event.preventDefault()}
      onDrop={(event) => {
        event.preventDefault();
        event.stopPropagation();
        setOver(false);
        flow.choose([...event.dataTransfer.files]);
      }}
    >
      <div className="gw-section">
        <h2 className="min-w-0 break-words">{title}</h2>
        <Button look="text" className="ml-auto h-[24px]!" onClick={onClose}>
          Close
        </Button>
      </div>
      <input
        ref={field}
        type="file"
        className="sr-only"
        tabIndex={-1}
        aria-label="File to upload"
        accept=".csv,.tsv,.txt,text/csv,text/tab-separated-values"
        multiple
        onChange={(event) => {
          flow.choose([...(event.target.files ?? [])]);
          event.target.value = '';
        }}
      />
      <div aria-live="polite">{body}</div>
    </section>
  );
}
