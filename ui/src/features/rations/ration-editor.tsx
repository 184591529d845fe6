import type { FeedstuffListItem, RationView, WaterSourceView, YardView } from '@brimgate/rules';
import { type ReactNode, useMemo } from 'react';
import { useBlocker } from 'react-router-dom';
import { Button } from '../../components/button';
import { Dialog } from '../../components/dialog';
import { ErrorSummary } from '../../components/error-summary';
import { Page } from '../../components/page';
import { ProblemNotice } from '../../components/problem-notice';
import { CattleFacts } from './cattle-facts';
import { CattleSection } from './cattle-section';
import { ConflictDialog } from './conflict-dialog';
import { faultWithPlace } from './fault-words';
import { LinesSection } from './lines-section';
import { NextActs } from './next-acts';
import type { Screened } from './preview';
import styles from './ration-editor.module.css';
import { RationLead } from './ration-lead';
import { useFaults } from './use-faults';
import { usePreview } from './use-preview';
import { useRationEditor } from './use-ration-editor';
import { useScreenAndKeep } from './use-screen-and-keep';
import { WaterSection } from './water-section';

/** What the page draws beside the sheet; the findings belong to another feature and come in from the page. */
export interface RationSlots {
  verdict: (screened: Screened) => ReactNode;
  headroom: (screened: Screened) => ReactNode;
  findings: (screened: Screened) => ReactNode;
}

interface RationEditorProps {
  ration: RationView;
  feedstuffs: readonly FeedstuffListItem[];
  waterSources: readonly WaterSourceView[];
  yard: YardView;
  canEdit: boolean;
  slots: RationSlots;
  /** Below the notebook: where it stands and what it still needs. */
  standing: ReactNode;
  /** Below everything. */
  foot: ReactNode;
}

/** An open notebook: what is fed and drunk on the left, what it does on the right. */
export function RationEditor({
  ration,
  feedstuffs,
  waterSources,
  yard,
  canEdit,
  slots,
  standing,
  foot,
}: RationEditorProps) {
  // What the signer reads must not move under their eyes: it is withdrawn first.
  const mayChange = canEdit && ration.state !== 'in-review';
  const editor = useRationEditor(ration);
  const { form, values, saver, saveState } = editor;
  const preview = usePreview({ values, feedstuffs, waterSources, yard, stored: ration.screening });
  const faults = useFaults(values, saveState);
  const keep = useScreenAndKeep({ ration, saver, form, onRefused: faults.refuse });
  const { screened } = preview;
  const isHeld = saveState.kind === 'held' || saveState.kind === 'failed' || saveState.kind === 'conflict';
  const blocker = useBlocker(
    ({ currentLocation, nextLocation }) => isHeld && currentLocation.pathname !== nextLocation.pathname,
  );
  // Drawn anew only when there are new findings, not with each key.
  const drawn = useMemo(() => screened && drawnSlots(slots, screened), [slots, screened]);
  const intake = screened?.screening.totals.dryMatterIntakeKgPerDay ?? null;

  return (
    <Page
      title={values.name.trim() === '' ? 'Ration without a name' : values.name}
      above={ration.yard.name}
      lead={
        <RationLead
          ration={ration}
          values={values}
          intakeKgPerDay={intake}
          saver={saver}
          saveState={saveState}
          timeZone={yard.timeZone}
        />
      }
      hasFaults={faults.summary.length > 0}
      actions={<NextActs ration={ration} canEdit={canEdit} hasUnscreenedChanges={saver.isDirty} keep={keep} />}
    >
      <ErrorSummary
        faults={faults.summary.map(faultWithPlace)}
        attempt={faults.attempt}
        title="It cannot be screened yet"
      />
      {keep.problem !== null && <ProblemNotice problem={keep.problem} />}
      {drawn && (
        <div className={preview.isStale ? styles.dimmed : undefined} aria-busy={preview.isStale}>
          {drawn.verdict}
        </div>
      )}
      <p role="status" className={styles.wanting}>
        {preview.wanting &&
          (screened
            ? `The findings are of the last complete ration: ${preview.wanting}`
            : `Findings appear as soon as they can be reckoned: ${preview.wanting}`)}
      </p>
      <div className={styles.notebook}>
        <div>
          <LinesSection
            form={form}
            feedstuffs={feedstuffs}
            dryMatterIntakeKgPerDay={intake}
            canEdit={mayChange}
            faultAt={faults.at}
          />
          <WaterSection
            form={form}
            sources={waterSources}
            totals={screened?.screening.totals ?? null}
            canEdit={mayChange}
            faultAt={faults.at}
          />
          {mayChange ? (
            <CattleSection
              form={form}
              predictedIntakeKgPerDay={values.cattle.dryMatterIntakeKgPerDay.trim() === '' ? intake : null}
              faultAt={faults.at}
            />
          ) : (
            <CattleFacts cattle={values.cattle} />
          )}
        </div>
        <div className={preview.isStale ? styles.dimmed : undefined}>{drawn?.headroom}</div>
      </div>
      {standing}
      {drawn && <div className={preview.isStale ? styles.dimmed : undefined}>{drawn.findings}</div>}
      {foot}
      {saveState.kind === 'conflict' && (
        <ConflictDialog
          {...saveState}
          feedstuffs={feedstuffs}
          timeZone={yard.timeZone}
          onResolve={(chosen) => {
            form.reset(chosen);
            saver.resolve(chosen);
          }}
        />
      )}
      <LeaveDialog
        isOpen={blocker.state === 'blocked'}
        onStay={() => blocker.reset?.()}
        onLeave={() => blocker.proceed?.()}
      />
    </Page>
  );
}

const drawnSlots = (slots: RationSlots, screened: Screened) => ({
  verdict: slots.verdict(screened),
  headroom: slots.headroom(screened),
  findings: slots.findings(screened),
});

function LeaveDialog({ isOpen, onStay, onLeave }: { isOpen: boolean; onStay: () => void; onLeave: () => void }) {
  return (
    <Dialog
      isOpen={isOpen}
      onClose={onStay}
      title="What you typed last is not saved"
      description="Stay to mend what is marked; leave, and the last changes are lost."
      actions={
        <>
          <Button onClick={onLeave}>Leave without them</Button>
          <Button kind="primary" onClick={onStay}>
            Stay
          </Button>
        </>
      }
    />
  );
}
