import type { OrderView } from '@linkfell/contracts';
import { chakra } from '@chakra-ui/react';
import { formatDateTime } from '../../lib/format-date';

const Item = chakra('li', {
  base: {
    position: 'relative',
    paddingLeft: '8',
    paddingBottom: '5',
    '&:not(:last-child)::before': {
      content: '""',
      position: 'absolute',
      left: '9px',
      top: '20px',
      bottom: '0',
      borderLeftWidth: '2px',
      borderColor: 'hair',
    },
  },
});

/** What has happened, and what comes, each with its date. */
export function Timeline({ events, zone }: { events: OrderView['timeline']; zone?: string }) {
  return (
    <chakra.ol listStyleType="none">
      {events.map((event, index) => (
        <Item key={index}>
          <chakra.svg
            viewBox="0 0 20 20"
            width="20px"
            height="20px"
            position="absolute"
            left="0"
            top="2px"
            color={event.done ? 'moss' : 'slate'}
            aria-hidden="true"
          >
            <circle
              cx="10"
              cy="10"
              r="7.5"
              fill={event.done ? 'currentColor' : 'none'}
              stroke="currentColor"
              strokeWidth="2"
            />
          </chakra.svg>
          <chakra.span fontWeight="bold">{event.title}</chakra.span>
          <chakra.span srOnly>{event.done ? ', done' : ', to come'}</chakra.span>
          {event.at ? <chakra.span color="slate"> · {formatDateTime(event.at, zone)}</chakra.span> : null}
          {event.detail ? <chakra.p color="slate">{event.detail}</chakra.p> : null}
        </Item>
      ))}
    </chakra.ol>
  );
}
