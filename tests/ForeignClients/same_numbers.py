"""Compares two answers in the proto3 JSON mapping: the same fields, the same texts, and numbers of the same bits."""

import json
import struct
import sys


def bits(number):
    """The eight bytes of a number; 5 and 5.0 are the same double."""
    return struct.pack(">d", float(number))


def differences(left, right, path):
    """Yields one line per difference."""
    if isinstance(left, dict) and isinstance(right, dict):
        for key in sorted(left.keys() | right.keys()):
            if key not in left or key not in right:
                yield f"{path}.{key} is only in the {'first' if key in left else 'second'}"
            else:
                yield from differences(left[key], right[key], f"{path}.{key}")
    elif isinstance(left, list) and isinstance(right, list):
        if len(left) != len(right):
            yield f"{path} has {len(left)} and {len(right)} entries"
        for index, (one, other) in enumerate(zip(left, right)):
            yield from differences(one, other, f"{path}[{index}]")
    elif is_number(left) and is_number(right):
        if bits(left) != bits(right):
            yield f"{path} is {left!r} and {right!r}"
    elif left != right or type(left) is not type(right):
        yield f"{path} is {left!r} and {right!r}"


def is_number(value):
    """True for a JSON number; true and false are none."""
    return isinstance(value, (int, float)) and not isinstance(value, bool)


def count(value):
    """How many numbers an answer holds."""
    if isinstance(value, dict):
        return sum(map(count, value.values()))
    if isinstance(value, list):
        return sum(map(count, value))
    return int(is_number(value))


def answer(file):
    """The answer of a file: the C# tool writes it alone, other clients within the response."""
    with open(file, encoding="utf-8") as text:
        message = json.load(text)
    return message.get("answer", message)


def main(first, second):
    """Prints up to ten differences; returns 1 where there is one."""
    left, right = answer(first), answer(second)
    found = list(differences(left, right, "answer"))
    print("\n".join(found[:10]) or f"{count(left)} numbers are the same")
    # An answer of a handful of numbers is none: two empty ones would be the same.
    return 1 if found or count(left) < 500 else 0


if __name__ == "__main__":
    sys.exit(main(*sys.argv[1:]))
