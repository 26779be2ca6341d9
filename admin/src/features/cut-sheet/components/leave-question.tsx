import { useEffect } from 'react';
import { useBlocker } from 'react-router-dom';
import { Button } from '../../../components/ui/button.js';
import { Question } from '../../../components/ui/dialog.js';

/** Asks before what was typed is left behind: within the Workroom by itself, at a closed window through the browser. */
export function LeaveQuestion({ unsaved }: { readonly unsaved: boolean }) {
  const blocker = useBlocker(unsaved);
  useEffect(() => {
    if (!unsaved) return;
    const warn = (event: BeforeUnloadEvent) => event.preventDefault();
    window.addEventListener('beforeunload', warn);
    return () => window.removeEventListener('beforeunload', warn);
  }, [unsaved]);
  return (
    <Question
      open={blocker.state === 'blocked'}
      onClose={() => blocker.reset?.()}
      title="Leave without saving?"
      actions={
        <>
          <Button tone="action" onClick={() => blocker.reset?.()}>
            Stay here
          </Button>
          <Button tone="danger" onClick={() => blocker.proceed?.()}>
            Leave without saving
          </Button>
        </>
      }
    >
      <p>What you changed on this cut sheet is not saved yet.</p>
    </Question>
  );
}
