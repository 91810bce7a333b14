import type { CSSProperties } from 'react';
import CircleCheck from 'lucide-react-native/icons/circle-check';
import { color, face } from '@/components/theme';
import { Link, Mark } from '@/components/ui';

export interface StartStep {
  key: string;
  title: string;
  detail: string;
  state: 'done' | 'next' | 'later';
  /** Where it is done, when it can be done now. */
  href?: string;
}

const tick = (state: StartStep['state']): CSSProperties =>
  state === 'next'
    ? {
        position: 'absolute',
        left: -2,
        top: 14,
        borderStyle: 'solid',
        borderWidth: '7px 0 7px 10px',
        borderColor: `transparent transparent transparent ${color.accent}`,
      }
    : { position: 'absolute', left: 0, top: 20, width: 14, height: 2, background: color.lineControl };

/** The steps of a new project along a scale, with the mark at the next one. */
export function StartSteps({ steps }: { steps: readonly StartStep[] }) {
  return (
    <ol aria-label="Steps of a new project">
      {steps.map(({ key, title, detail, state, href }) => (
        <li
          key={key}
          aria-current={state === 'next' ? 'step' : undefined}
          style={{
            position: 'relative',
            display: 'flex',
            gap: 12,
            padding: '10px 0 10px 26px',
            borderLeft: `2px solid ${state === 'done' ? color.accent : color.lineControl}`,
            font: `400 14px/20px ${face.text}`,
            color: color.inkSoft,
          }}
        >
          <span style={tick(state)} />
          <div style={{ flex: 1, minWidth: 0 }}>
            <p
              style={{
                font: `600 16px/24px ${face.text}`,
                color: state === 'later' ? color.inkSoft : color.ink,
              }}
            >
              {href ? (
                <Link href={href} className="lone-link">
                  {title}
                </Link>
              ) : (
                title
              )}
            </p>
            <p style={{ overflowWrap: 'anywhere' }}>{detail}</p>
          </div>
          <span style={{ flex: 'none', paddingTop: 4 }}>
            {state === 'done' ? (
              <Mark tone="good" icon={CircleCheck}>
                done
              </Mark>
            ) : null}
            {state === 'next' ? <Mark tone="accent">next</Mark> : null}
          </span>
        </li>
      ))}
    </ol>
  );
}
