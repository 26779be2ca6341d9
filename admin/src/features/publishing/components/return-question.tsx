import { ReturnReason } from '@ellwand/shared/records/publishing';
import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import type { z } from 'zod';
import { Button } from '../../../components/ui/button.js';
import { Question } from '../../../components/ui/dialog.js';
import { TextArea } from '../../../components/ui/field.js';
import { Refused } from '../../../components/ui/states.js';

type Reason = z.infer<typeof ReturnReason>;

interface ReturnQuestionProps {
  readonly open: boolean;
  readonly onClose: () => void;
  readonly error: unknown;
  readonly onSay: (body: Reason) => void;
}

/** Back to draft, with the reason that its writers will read. */
export function ReturnQuestion({ open, onClose, error, onSay }: ReturnQuestionProps) {
  const form = useForm<Reason>({ resolver: zodResolver(ReturnReason), defaultValues: { reason: '' } });
  const say = form.handleSubmit(onSay);
  return (
    <Question
      open={open}
      onClose={onClose}
      title="Return this record"
      actions={
        <>
          <Button tone="action" onClick={() => void say()}>
            Return it
          </Button>
          <Button onClick={onClose}>Leave it in the queue</Button>
        </>
      }
    >
      <TextArea
        id="return-reason"
        label="What should be done"
        hint="Shown to whoever works on it next."
        error={form.formState.errors.reason?.message}
        {...form.register('reason')}
      />
      <Refused error={error} />
    </Question>
  );
}
