import { Tab, TabGroup, TabList, TabPanel, TabPanels } from '@headlessui/react';
import type { Sheet } from '@ellwand/shared/records/sheet';
import { lazy, type ReactNode, Suspense, useEffect, useRef, useState } from 'react';
import { useSearchParams } from 'react-router-dom';
import { Button } from '../../../components/ui/button.js';
import { Question } from '../../../components/ui/dialog.js';
import { Waiting } from '../../../components/ui/states.js';
import { useSettled } from '../../../lib/use-settled.js';
import { stepWords } from '../model/sheet-points.js';
import { useLatest } from '../model/use-latest.js';
import { useSheetDesk, type SheetDesk } from '../model/use-sheet-desk.js';
import { BottomBar } from './bottom-bar.js';
import { DiagramPanel } from './diagram-panel.js';
import { Keypad } from './keypad.js';
import { NewestProtocol } from './newest-protocol.js';
import { useTableKeys } from './keys-question.js';
import { PausedNotice, PauseQuestion } from './pause.js';
import { ReadingList } from './reading-list.js';
import { SheetHeader } from './sheet-header.js';

// What the first figure does not wait for: the other tabs come when they are looked at.
const other = () => import('./other-panels.js');
const BoxList = lazy(async () => ({ default: (await other()).BoxList }));
const DescribedPanel = lazy(async () => ({ default: (await other()).DescribedPanel }));
const DerivedPanel = lazy(async () => ({ default: (await other()).DerivedPanel }));
const FactsPanel = lazy(async () => ({ default: (await other()).FactsPanel }));
const FindingsPanel = lazy(async () => ({ default: (await other()).FindingsPanel }));

const tabs = ['readings', 'findings', 'worked-out', 'noted', 'box', 'facts'] as const;
type TabName = (typeof tabs)[number];

/** The measuring table: diagram at the left, rows at the right, the work's own bar beneath. */
export function SheetScreen({ sheet }: { readonly sheet: Sheet }) {
  const desk = useSheetDesk(sheet);
  const [search, setSearch] = useSearchParams();
  const shown = Math.max(0, tabs.indexOf((search.get('show') ?? 'readings') as TabName));
  const show = (tab: TabName) => {
    if (tab !== tabs[shown]) setSearch(tab === 'readings' ? {} : { show: tab }, { replace: true });
  };
  // The next row takes its figure before its line is lit.
  const lit = useSettled(desk.current);
  const [asking, setAsking] = useState(false);
  const [keysShown, setKeysShown] = useState(false);
  useTableKeys(desk, {
    onNotTaken: () => setAsking(true),
    onTab: (index) => show(tabs[index] ?? 'readings'),
  });
  const { chooseRow } = useLatest({
    chooseRow: (pointId: string) => {
      show('readings');
      const row =
        desk.rows.find(({ point, reading }) => point.id === pointId && !reading) ??
        desk.rows.find(({ point }) => point.id === pointId);
      if (row) desk.go(row.key);
    },
  });
  return (
    <div className="flex h-dvh flex-col">
      <div className="relative flex min-h-0 grow flex-col max-md:overflow-y-auto">
        <SheetHeader desk={desk} />
        <main className="grid grow grid-cols-[minmax(0,1fr)] max-md:content-start md:min-h-0 md:grid-cols-[20rem_minmax(0,1fr)] lg:grid-cols-[25rem_minmax(0,1fr)]">
          <div className="min-h-0 border-hair max-md:border-b md:relative md:overflow-y-auto md:border-r">
            {lit && (
              <DiagramPanel
                kind={sheet.kind}
                points={desk.points}
                ownPoints={desk.sheet.protocol.ownPoints}
                current={lit.point}
                worn={lit.worn}
                onChoose={chooseRow}
              />
            )}
          </div>
          <div className="flex min-w-0 flex-col md:min-h-0">
            <TabGroup
              selectedIndex={shown}
              onChange={(index) => show(tabs[index] ?? 'readings')}
              className="flex grow flex-col md:min-h-0"
            >
              <SheetTabs desk={desk} />
              <TabPanels className="grow md:relative md:min-h-0 md:overflow-y-auto">
                <Panel>
                  <PausedNotice desk={desk} />
                  <NewestProtocol desk={desk} />
                  <ReadingList desk={desk} />
                </Panel>
                <Panel>
                  <FindingsPanel desk={desk} onPoint={chooseRow} />
                </Panel>
                <Panel>
                  <DerivedPanel desk={desk} onPoint={chooseRow} />
                </Panel>
                <Panel>
                  <DescribedPanel desk={desk} />
                </Panel>
                <Panel>
                  <BoxList
                    desk={desk}
                    onPoint={chooseRow}
                    onFindings={() => show('findings')}
                    onNoted={() => show('noted')}
                  />
                </Panel>
                <Panel>
                  <FactsPanel sheet={sheet} points={desk.points} />
                </Panel>
              </TabPanels>
            </TabGroup>
            {desk.keypad && !desk.locked && shown === 0 && <Keypad desk={desk} />}
          </div>
        </main>
      </div>
      <BottomBar
        desk={desk}
        ways={{ asking, setAsking, keysShown, setKeysShown }}
        onReadings={() => show('readings')}
      />
      <PauseQuestion desk={desk} />
      <TurnQuestion desk={desk} />
    </div>
  );
}

const Panel = ({ children }: { readonly children: ReactNode }) => (
  <TabPanel className="pb-24 focus:outline-none">
    <Suspense fallback={<Waiting label="Opening" rows={3} />}>{children}</Suspense>
  </TabPanel>
);

function SheetTabs({ desk }: { readonly desk: SheetDesk }) {
  const open =
    desk.findings.data?.findings.filter(({ severity, answer }) => severity !== 'note' && answer === null)
      .length ?? 0;
  const labels = ['Readings', 'Findings', 'Worked out', 'Noted', 'Box list', 'Facts'];
  return (
    <TabList className="flex shrink-0 gap-1 overflow-x-auto border-b border-hair bg-sheet px-2">
      {labels.map((label, index) => (
        <Tab
          key={tabs[index]}
          className="min-h-11 whitespace-nowrap border-b-2 border-transparent px-3 text-table text-ink-2 focus-visible:-outline-offset-3 data-selected:border-indigo data-selected:font-medium data-selected:text-ink"
        >
          {label}
          {label === 'Findings' && open > 0 && (
            <span className="figures ml-2 rounded-full bg-madder-tint px-2 text-label font-medium text-madder">
              {open} <span className="sr-only">open</span>
            </span>
          )}
        </Tab>
      ))}
    </TabList>
  );
}

/** "Turn over: two people", said once when the work comes to a new handling step. */
function TurnQuestion({ desk }: { readonly desk: SheetDesk }) {
  const go = useRef<HTMLButtonElement>(null);
  const { locked, go: goTo, current, rows } = desk;
  const started = useRef(false);
  useEffect(() => {
    // Opening the garment is the first handling step, and is said as soon as the sheet is.
    if (started.current || locked || rows.every(({ reading }) => reading !== null)) return;
    started.current = true;
    goTo(current.key);
  }, [locked, goTo, current.key, rows]);
  const words = desk.turn && stepWords[desk.turn];
  return (
    <Question
      open={words !== null && !locked}
      onClose={desk.turned}
      first={go}
      title={words?.title ?? ''}
      actions={
        <Button ref={go} tone="action" height="table" onClick={desk.turned}>
          It lies so: go on
        </Button>
      }
    >
      <p>{words?.words}</p>
    </Question>
  );
}
