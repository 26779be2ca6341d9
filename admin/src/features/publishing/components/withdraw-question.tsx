import { Withdrawal } from '@ellwand/shared/records/publishing';
import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import type { z } from 'zod';
import { Button } from '../../../components/ui/button.js';
import { Question } from '../../../components/ui/dialog.js';
import { TextArea } from '../../../components/ui/field.js';
import { Refused } from '../../../components/ui/states.js';

interface WithdrawQuestionProps {
  readonly open: boolean;
  readonly onClose: () => void;
  readonly error: unknown;
  readonly onWithdraw: (body: Withdrawal) => void;
}

/** The public wording and the inner reason are two things; only the first leaves the Workroom. */
export function WithdrawQuestion({ open, onClose, error, onWithdraw }: WithdrawQuestionProps) {
  const form = useForm<z.input<typeof Withdrawal>, unknown, Withdrawal>({
    resolver: zodResolver(Withdrawal),
    defaultValues: { notice: '', innerReason: '' },
  });
  const { errors } = form.formState;
  const withdraw = form.handleSubmit(onWithdraw);
  return (
    <Question
      open={open}
      onClose={onClose}
      title="Withdraw from the public?"
      actions={
        <>
          <Button tone="danger" onClick={() => void withdraw()}>
            Withdraw every version
          </Button>
          <Button onClick={onClose}>Leave it public</Button>
        </>
      }
    >
      <p>Its address, every version and every picture answer at once that the garment was withdrawn.</p>
      <TextArea
        id="withdraw-notice"
        label="What the public reads"
        hint="One or two sentences on the withdrawal notice."
        error={errors.notice?.message}
        {...form.register('notice')}
      />
      <TextArea
        id="withdraw-inner"
        optional
        label="Inner reason"
        hint="Stays in the Workroom."
        error={errors.innerReason?.message}
        {...form.register('innerReason')}
      />
      <Refused error={error} />
    </Question>
  );
}
