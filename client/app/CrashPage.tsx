import { Button } from '../components/ui/Button.tsx';
import { StateNote } from '../components/ui/StateNote.tsx';

/** A page that could not be shown or loaded. What is stored is not touched by it. */
export function CrashPage() {
  return (
    <main className="min-h-screen bg-sheet px-5">
      <StateNote
        art="broken"
        place="Page, not shown"
        title="This page could not be shown"
        wholePage
        actions={
          <Button look="primary" onClick={() => window.location.reload()}>
            Load the page again
          </Button>
        }
      >
        <p>What is stored stays as it is. A newer version may have been put up since this page was opened.</p>
      </StateNote>
    </main>
  );
}
