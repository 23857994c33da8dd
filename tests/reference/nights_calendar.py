"""Reads a calendar of a proposal with python3-icalendar (Debian) and says what it holds; any fault is an error.

Run: /usr/bin/python3 nights_calendar.py file.ics
"""
import sys
from datetime import date, datetime, timedelta, timezone

from icalendar import Calendar

with open(sys.argv[1], 'rb') as file:
    raw = file.read()

assert b'\r\n' in raw and b'\n' not in raw.replace(b'\r\n', b''), 'lines end in CRLF'
assert max(map(len, raw.split(b'\r\n'))) <= 75, 'lines have at most 75 octets'
calendar = Calendar.from_ical(raw)
assert calendar['VERSION'] == '2.0' and calendar['PRODID'], 'a calendar says its version and maker'
events = calendar.walk('VEVENT')
assert all(not event.errors for event in events), [event.errors for event in events]
uids = [str(event['UID']) for event in events]
assert len(set(uids)) == len(uids), 'ids are unique'
for event in events:
    stamp, start = event['DTSTAMP'].dt, event['DTSTART'].dt
    assert stamp.tzinfo is not None and abs(datetime.now(timezone.utc) - stamp) < timedelta(hours=1), stamp
    assert isinstance(start, date) and (not isinstance(start, datetime) or start.utcoffset() == timedelta(0)), start
    if 'DTEND' in event:
        assert event['DTEND'].dt > start, 'an event ends after it begins'
nights = [event for event in events if '-night-' in str(event['UID'])]
assert all(str(event['STATUS']) == 'TENTATIVE' for event in nights)
print(len(events), 'events,', len(nights), 'nights; the first:', nights[0]['SUMMARY'] if nights else 'none')
