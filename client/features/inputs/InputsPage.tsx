import { useCallback, useEffect, useMemo, useRef, useState } from 'react';
import { Navigate, useNavigate, useParams, useSearchParams, useNavigation } from 'react-router-dom';

import { editableTables, type EditableTable } from '#shared/contracts/tableColumns';
import { templateCsv } from '#shared/csv/writeCsv';

import { ErrorState } from '../../app/ErrorState.tsx';
import { sentenceOf } from '../../app/errorSentences.ts';
import { PageFrame } from '../../app/PageFrame.tsx';
import { inputTabs, paths } from '../../app/paths.ts';
import { useBuildingId } from '../../app/useBuildingId.ts';
import { useCanEdit } from '../../app/useCanEdit.ts';
import { useChoice } from '../../app/useChoice.ts';
import { Button } from '../../components/ui/Button.tsx';
import { StateNote } from '../../components/ui/StateNote.tsx';
import { useLate } from '../../components/ui/useLate.ts';
import { elevationView } from '../../data/elevationView.ts';
import { usePatchTable } from '../../data/mutations.ts';
import { useBuilding } from '../../data/queries.ts';
import { downloadText } from './downloadText.ts';
import { CombinationsInForce } from './CombinationsInForce.tsx';
import { lateralCases } from './countedCombinations.ts';
import { EmptyTable } from './EmptyTable.tsx';
import { focusRow } from './focusRow.ts';
import { ForcesReading } from './ForcesReading.tsx';
import { valueOf, type InputRow } from './inputColumns.ts';
import { InputStack } from './InputStack.tsx';
import { InputTabs } from './InputTabs.tsx';
import { newRow } from './newRow.ts';
import { SettingsPane } from './SettingsPane.tsx';
import { StoryForceHelp } from './StoryForceHelp.tsx';
import { TablePane } from './TablePane.tsx';
import { tabLines } from './tabNames.ts';
import { tableSummary } from './tableSummary.ts';
import { UploadPanel } from './UploadPanel.tsx';
import { useInputTables } from './useInputTables.ts';
import { useUploadFlow } from './useUploadFlow.ts';

const hints = [
  { keys: ['Enter'], does: 'edit' },
  { keys: ['Ctrl', 'V'], does: 'paste rows' },
  { keys: ['Ctrl', 'Z'], does: 'undo' },
];

/** Arrow keys pass many rows a second; the address follows once the focus rests. */
const restMilliseconds = 150;

export function InputsPage() {
  const id = useBuildingId();
  const { tab: wanted } = useParams();
  const tab = inputTabs.find((one) => one === wanted);
  const building = useBuilding(id);
  const canEdit = useCanEdit();
  const navigate = useNavigate();
  const [choice, choose] = useChoice();
  const [parameters] = useSearchParams();
  const [uploading, setUploading] = useState(false);
  const { queries, rows: allRows } = useInputTables(id);
  const units = building.data?.units ?? 'us';
  const flow = useUploadFlow(id, units, (table) => void navigate(paths.inputs(id, table)));
  const table: EditableTable = editableTables.find((one) => one === tab) ?? 'levels';
  const patchTable = usePatchTable(id, table);
  const late = useLate(queries[table].isPending);

  const rows: readonly InputRow[] = allRows[table];
  const view = useMemo(() => elevationView(allRows.levels, allRows.walls), [allRows]);
  const context = useMemo(
    () => ({
      units,
      rows: allRows[table] as readonly InputRow[],
      levels: allRows.levels.map((row) => row.level),
      walls: [...new Set(allRows.walls.map((row) => row.wall))],
      cases: [...new Set(allRows.forces.map((row) => row.case))],
      elevations: new Map(view.stories.map((story) => [story.level, story.elevation])),
    }),
    [units, allRows, table, view],
  );
  const focusRowId = focusRow(rows, table, parameters.get('row'), choice);

  const resting = useRef<ReturnType<typeof setTimeout> | undefined>(undefined);
  useEffect(() => () => clearTimeout(resting.current), []);
  // a story that comes to rest while another page is being fetched must not call the reader back
  const leaving = useNavigation().state !== 'idle';
  useEffect(() => {
    if (leaving) clearTimeout(resting.current);
  }, [leaving]);
  const onFocusRow = useCallback(
    (row: InputRow) => {
      clearTimeout(resting.current);
      resting.current = setTimeout(() => {
        const name = (column: string) => {
          const value = valueOf(row, column);
          return typeof value === 'string' ? value : undefined;
        };
        const part = { level: name('level'), wall: name('wall'), case: name('case') };
        choose(Object.fromEntries(Object.entries(part).filter(([, value]) => value !== undefined)));
      }, restMilliseconds);
    },
    [choose],
  );

  // rows pasted where there is no grid yet go the way of a file, heads included
  const empty = tab !== 'settings' && queries[table].data !== undefined && rows.length === 0;
  const pasteAsFile = useRef<(text: string) => void>(() => undefined);
  useEffect(() => {
    pasteAsFile.current = (text) => {
      setUploading(true);
      flow.choose([new File([text], `${table}.csv`, { type: 'text/csv' })]);
    };
  });
  useEffect(() => {
    if (!empty || !canEdit) return undefined;
    const onPaste = (event: ClipboardEvent) => {
      if (event.target instanceof HTMLInputElement) return;
      const text = event.clipboardData?.getData('text/plain') ?? '';
      if (text.trim() !== '') pasteAsFile.current(text);
    };
    document.addEventListener('paste', onPaste);
    return () => document.removeEventListener('paste', onPaste);
  }, [empty, canEdit]);

  if (tab === undefined) return <Navigate to={paths.inputs(id, 'levels')} replace />;
  const query = queries[table];
  const template = () => downloadText(`${table}.csv`, templateCsv(table, units));
  const storyCount = view.stories.length;
  const pane =
    tab === 'settings' ? (
      building.data === undefined ? null : (
        <SettingsPane
          building={building.data}
          canEdit={canEdit}
          hasRows={editableTables.some((one) => queries[one].data?.rows.length !== 0)}
          cases={context.cases}
          walls={context.walls}
        />
      )
    ) : query.isError ? (
      <ErrorState error={query.error} place="Inputs" buildingId={id} onRetry={() => void query.refetch()} />
    ) : query.isPending ? (
      late ? (
        <StateNote art="filling" place="Inputs, loading" title="Fetching the table">
          <p>The server has not answered yet.</p>
        </StateNote>
      ) : null
    ) : rows.length === 0 ? (
      uploading ? null : (
        <>
          <EmptyTable
            table={table}
            canEdit={canEdit}
            onUpload={() => setUploading(true)}
            onTemplate={template}
            onAdd={() =>
              patchTable.mutate({ inserts: [{ after: null, row: newRow(table, { ...context, beside: null }) }] })
            }
          />
          {table === 'combinations' && building.data !== undefined ? (
            <CombinationsInForce building={building.data} cases={lateralCases(allRows.forces)} />
          ) : null}
          {patchTable.error === null ? null : (
            <p className="gw-problem font-medium" role="alert">
              {patchTable.error.problems[0]?.message ?? sentenceOf(patchTable.error)}
            </p>
          )}
        </>
      )
    ) : (
      <TablePane
        key={table}
        buildingId={id}
        table={table}
        context={context}
        canEdit={canEdit}
        focusRowId={focusRowId}
        onFocusRow={onFocusRow}
        summary={tableSummary(table, allRows, view, units)}
      />
    );

  return (
    <PageFrame
      title="Inputs"
      sub={tabLines[tab]}
      stackTitle={
        queries.levels.isPending
          ? ''
          : storyCount === 0
            ? 'No stories'
            : storyCount === 1
              ? '1 story'
              : `${storyCount} stories`
      }
      stackSub={
        queries.levels.isPending
          ? ''
          : storyCount === 0
            ? 'they come with levels.csv'
            : `${view.height.toFixed(units === 'us' ? 1 : 2)} ${units === 'us' ? 'ft' : 'm'} above the base`
      }
      stack={
        storyCount === 0 ? null : (
          <InputStack
            view={view}
            forces={allRows.forces}
            units={units}
            case={choice.case}
            chosen={choice.level}
            chosenWall={choice.wall}
            onChoose={(level) => choose({ level })}
          />
        )
      }
      computes={allRows.levels.length > 0 && allRows.walls.length > 0 && allRows.forces.length > 0}
      keys={tab === 'settings' ? [] : hints}
      actions={
        canEdit ? (
          <>
            {tab === 'settings' ? null : <Button onClick={template}>Template</Button>}
            {uploading || empty ? null : (
              <Button look={tab === 'settings' ? 'plain' : 'primary'} onClick={() => setUploading(true)}>
                Upload a table
              </Button>
            )}
          </>
        ) : null
      }
    >
      <InputTabs
        buildingId={id}
        tab={tab}
        counts={Object.fromEntries(
          editableTables.flatMap((one) => {
            const { data } = queries[one];
            return data === undefined ? [] : [[one, data.rows.length]];
          }),
        )}
      />
      <div
        id="input-pane"
        role="tabpanel"
        aria-labelledby={`tab-${tab}`}
        className={uploading && canEdit ? 'gw-inputs gw-inputs-uploading' : 'gw-inputs'}
        onDragOver={(event) => {
          if (!canEdit) return;
          event.preventDefault();
          setUploading(true);
        }}
        onDrop={(event) => {
          event.preventDefault();
          if (canEdit) flow.choose([...event.dataTransfer.files]);
        }}
      >
        <div className="min-w-0">
          {pane}
          {tab === 'forces' && rows.length > 0 && building.data !== undefined ? (
            <ForcesReading building={building.data} levels={allRows.levels} forces={allRows.forces} canEdit={canEdit} />
          ) : null}
          {tab === 'forces' && canEdit && building.data !== undefined ? (
            <StoryForceHelp
              buildingId={id}
              units={units}
              forcesAre={building.data.forcesAre}
              levels={allRows.levels}
              forces={allRows.forces}
            />
          ) : null}
        </div>
        {uploading && canEdit ? (
          <UploadPanel
            flow={flow}
            units={units}
            onClose={() => {
              flow.leave();
              setUploading(false);
            }}
          />
        ) : null}
      </div>
    </PageFrame>
  );
}
