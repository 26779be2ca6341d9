import type { Review } from '@ellwand/shared/records/publishing';
import { Button } from '../../../components/ui/button.js';
import { Question } from '../../../components/ui/dialog.js';
import { Refused } from '../../../components/ui/states.js';
import { changesSentence } from '../changes-sentence.js';

interface PublishQuestionProps {
  readonly open: boolean;
  readonly onClose: () => void;
  readonly review: Review;
  readonly error: unknown;
  readonly pending: boolean;
  readonly onPublish: () => void;
}

/** Publishing is asked once, and the question names what the public will see change. */
export function PublishQuestion({ open, onClose, review, error, pending, onPublish }: PublishQuestionProps) {
  return (
    <Question
      open={open}
      onClose={onClose}
      title={`Publish version ${review.nextVersion}?`}
      actions={
        <>
          <Button tone="action" disabled={pending} onClick={onPublish}>
            Publish version {review.nextVersion}
          </Button>
          <Button onClick={onClose}>Not yet</Button>
        </>
      }
    >
      <p>{changesSentence(review)}</p>
      <p className="text-ink-2">
        The public sees it at once. It can be withdrawn, but somebody may have read it by then.
      </p>
      <Refused error={error} />
    </Question>
  );
}
