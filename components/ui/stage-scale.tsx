import type { CSSProperties } from 'react';
import Check from 'lucide-react-native/icons/check';
import { color, face } from '@/components/theme';
import { Icon } from './icon';

export const uploadStages = ['upload', 'read', 'map', 'confirm', 'done'] as const;

export interface StageScaleProps {
  /** The words in order; an upload's five unless others are given. */
  stages?: readonly string[];
  /** The stage it stands at. */
  stage: string;
  /** Share of this stage that is done, from 0 to 1. */
  share?: number;
  state?: 'running' | 'waiting' | 'refused' | 'done';
  /** The live sentence: "Matching chain 17 of 32". */
  sentence?: string;
  label?: string;
}

/** How far along the whole scale, in percent: whole stages before this one, and the share of this one. */
export function stagePercent(stages: readonly string[], stage: string, share = 0): number {
  const place = stages.indexOf(stage);
  if (place < 0 || stages.length === 0) return 0;
  if (place === stages.length - 1) return 100;
  const within = Math.min(1, Math.max(0, share));
  return ((place + within) / stages.length) * 100;
}

const ticks: CSSProperties = {
  position: 'relative',
  height: 14,
  borderBottom: `2px solid ${color.lineRule}`,
  background: `repeating-linear-gradient(90deg, ${color.lineRule} 0 1px, transparent 1px 5%)`,
};

/** Long work as a graduated line with its stages; it can be left. */
export function StageScale(props: StageScaleProps) {
  const { stages = uploadStages, stage, share, state = 'running', sentence, label = 'Progress' } = props;
  const at = state === 'done' ? 100 : stagePercent(stages, stage, share);
  const place = stages.indexOf(stage);
  const ink = state === 'refused' ? color.danger : color.accent;
  return (
    <div style={{ display: 'grid', gap: 6 }}>
      <div
        role="progressbar"
        aria-label={label}
        aria-valuemin={0}
        aria-valuemax={100}
        aria-valuenow={Math.round(at)}
        aria-valuetext={state === 'refused' ? `refused at ${stage}` : (sentence ?? stage)}
        style={ticks}
      >
        <span
          style={{ position: 'absolute', left: 0, bottom: -2, height: 6, width: `${at}%`, background: ink }}
        />
        <span
          className="slide"
          style={{
            position: 'absolute',
            left: `${at}%`,
            top: -1,
            marginLeft: -5,
            borderStyle: 'solid',
            borderWidth: '8px 5px 0',
            borderColor: `${ink} transparent transparent`,
          }}
        />
      </div>
      <ol
        style={{
          display: 'grid',
          gridTemplateColumns: `repeat(${stages.length}, minmax(0,1fr))`,
          font: `400 12px/16px ${face.text}`,
        }}
      >
        {stages.map((word, index) => {
          const isDone = state === 'done' || index < place;
          const isNow = !isDone && index === place;
          return (
            <li
              key={word}
              aria-current={isNow ? 'step' : undefined}
              style={{
                display: 'flex',
                gap: 4,
                color: isNow ? color.ink : color.inkSoft,
                fontWeight: isNow ? 600 : 400,
              }}
            >
              {isDone ? <Icon of={Check} sizePixels={16} tone="soft" label="done:" /> : null}
              {isNow && state === 'refused' ? `${word}, refused` : word}
            </li>
          );
        })}
      </ol>
      {sentence ? (
        <p role="status" style={{ font: `400 14px/20px ${face.text}`, color: color.ink }}>
          {sentence}
        </p>
      ) : null}
    </div>
  );
}
