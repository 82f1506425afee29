import ical, {
  ICalCalendarMethod,
  ICalEventStatus,
  ICalEventTransparency,
  type ICalEventData,
} from 'ical-generator';

/** Something with a due time, as it stands in somebody's calendar. */
export interface DueEvent {
  /** The same for ever, so that a change moves the entry instead of adding another. */
  readonly uid: string;
  /** Grows with every change. */
  readonly sequence: number;
  readonly changedAt: Date;
  readonly dueAt: Date;
  readonly summary: string;
  readonly description: string;
  readonly url: string;
  readonly cancelled: boolean;
}

/**
 * Due dates as a calendar (RFC 5545): moments in UTC, each without a duration and leaving its owner
 * free; what was withdrawn is cancelled. The same events are written in the same bytes.
 */
export function writeCalendar(events: readonly DueEvent[]): string {
  const calendar = ical({
    name: 'Hornbeam',
    description: 'What is due',
    prodId: { company: 'Hornbeam', product: 'due dates', language: 'EN' },
    method: ICalCalendarMethod.PUBLISH,
    ttl: 60 * 60,
  });
  for (const event of events) calendar.createEvent(entryOf(event));
  return calendar.toString();
}

function entryOf(event: DueEvent): ICalEventData {
  return {
    id: event.uid,
    sequence: event.sequence,
    stamp: event.changedAt,
    lastModified: event.changedAt,
    start: event.dueAt,
    summary: event.cancelled ? `Withdrawn: ${event.summary}` : event.summary,
    description: event.description,
    url: event.url,
    status: event.cancelled ? ICalEventStatus.CANCELLED : ICalEventStatus.CONFIRMED,
    transparency: ICalEventTransparency.TRANSPARENT,
  };
}
