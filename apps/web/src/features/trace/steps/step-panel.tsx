import { stepOf } from '@lampwright/trace';
import { useTraceLog } from '../store/trace-session';
import { AbandonedStep } from './abandoned-step';
import { ConfirmStep } from './confirm/confirm-step';
import { InspectStep } from './inspect/inspect-step';
import { IntakeStep } from './intake/intake-step';
import { LampCheckStep } from './lamp-check/lamp-check-step';
import { MakeSafeStep } from './make-safe-step';
import { NarrowStep } from './narrow/narrow-step';
import { ProveStep } from './prove-step';
import { ReconnectStep } from './reconnect-step';
import { RepairStep } from './repair/repair-step';
import { SignStep } from './sign/sign-step';
import { SignedStep } from './signed-step';

/** The panel of the step that the trace is at. */
export function StepPanel({ onReplay }: { onReplay: () => void }) {
  const step = useTraceLog(stepOf);
  switch (step) {
    case 'intake':
      return <IntakeStep />;
    case 'makeSafe':
      return <MakeSafeStep />;
    case 'confirm':
      return <ConfirmStep />;
    case 'narrow':
      return <NarrowStep />;
    case 'inspect':
      return <InspectStep />;
    case 'repair':
      return <RepairStep />;
    case 'prove':
      return <ProveStep />;
    case 'reconnect':
      return <ReconnectStep />;
    case 'lampCheck':
      return <LampCheckStep />;
    case 'sign':
      return <SignStep />;
    case 'signed':
      return <SignedStep onReplay={onReplay} />;
    case 'abandoned':
      return <AbandonedStep onReplay={onReplay} />;
  }
}
