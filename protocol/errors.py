"""Every error that prytany raises on purpose, split by whose fault it is.

PrytanyError
├── UsageError            the caller asked for something that cannot be
│   ├── CharterError      the charter file, or a scheme's part of it, does not hold
│   └── KeyFileError      a member's key or home folder cannot be used
├── Rejected              a peer sent something that is refused; carries a counted reason
└── InternalError         a bug of ours: please report it
"""

__all__ = ["CharterError", "InternalError", "KeyFileError", "PrytanyError", "Rejected", "UsageError"]


class PrytanyError(Exception):
    """Base of all errors of this package: `except PrytanyError` catches anything from it."""


class UsageError(PrytanyError):
    """The caller's input does not hold; the message says what to change."""


class CharterError(UsageError):
    """The charter does not hold; the message names the field and the mend."""


class KeyFileError(UsageError):
    """A secret key or a member's home cannot be used as it is; the message says the way out."""


class Rejected(PrytanyError):  # noqa: N818 - it names what happened to the input, not a fault of ours
    """Input of a peer was refused.

    `reason` is one short snake_case word group out of a small fixed set, fit for a metric label;
    `detail` is for the log only and may quote numbers, never bytes of the input.
    """

    def __init__(self, reason: str, detail: str = "") -> None:
        super().__init__(f"{reason}: {detail}" if detail else reason)
        self.reason = reason
        self.detail = detail


class InternalError(PrytanyError):
    """Something happened that the code holds to be impossible."""
