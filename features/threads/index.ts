export { useConnection, useTyping } from '@/client/use-live';
export {
  applyToThreadOfSubject,
  applyToThreadPages,
  mergeThread,
  type SubjectThread,
  type ThreadPage,
} from './apply-thread-event';
export { joinLines, type ThreadLine } from './thread-lines';
export { usePostMessage, useThreadOfSubject, useThreads, type PostMessage } from './use-threads';
export { composerPlace } from '@/client/queued-message';
export { ThreadPanel, type ThreadPanelProps } from './components/thread-panel';
export { useResidueNames } from './use-residue-names';
