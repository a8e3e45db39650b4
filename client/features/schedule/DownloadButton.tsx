import { useMutation } from '@tanstack/react-query';
import type { ReactElement } from 'react';

import { sentenceOf } from '../../app/errorSentences.ts';
import { Button } from '../../components/ui/Button.tsx';
import { ApiError } from '../../data/ApiError.ts';
import { downloadWorkbook } from './downloadWorkbook.ts';

/** The one primary action of the page. */
export function DownloadButton({ id }: { id: string }): ReactElement {
  const download = useMutation({ mutationFn: () => downloadWorkbook(id) });
  return (
    <>
      {download.error instanceof ApiError ? (
        <span role="alert" className="gw-problem max-w-[40ch] text-note text-oxide">
          {sentenceOf(download.error)}
        </span>
      ) : null}
      <Button look="primary" disabled={download.isPending} onClick={() => download.mutate()}>
        Download workbook
      </Button>
    </>
  );
}
