"""Reads a sales sheet and works its totals out again from its line and payment rows alone."""

import json
import sys
from collections import defaultdict
from decimal import ROUND_HALF_UP, Decimal

from openpyxl import load_workbook

CENT = Decimal("0.01")
TEXT_COLUMNS = {"Invoice", "Customer", "Order", "For", "How", "Note", "Currency"}
MONEY_COLUMNS = {"Net", "Tax", "Total", "Amount", "Received"}


def exact(value):
    return Decimal(str(value))


def rows_of(book, name):
    head, *rows = book[name].iter_rows()
    titles = [cell.value for cell in head]
    return [dict(zip(titles, cells)) for cells in rows]


def faults_of(book):
    """Text must be text whatever it begins with, and money a number with two decimals."""
    for sheet in book.worksheets:
        for row in rows_of(book, sheet.title):
            for title, cell in row.items():
                where = f"{sheet.title}!{cell.coordinate}"
                if cell.value is None:
                    continue
                if cell.data_type == "f":
                    yield f"{where} is a formula"
                if title in TEXT_COLUMNS and cell.data_type != "s":
                    yield f"{where} is no text"
                # A day's own column may share a title with money.
                if title in MONEY_COLUMNS and not cell.is_date:
                    if cell.data_type != "n" or cell.number_format != "#,##0.00":
                        yield f"{where} is no amount"


def recompute(book):
    nets = defaultdict(Decimal)
    for line in rows_of(book, "Lines"):
        percent = line["Tax %"].value
        rate = None if percent is None else exact(percent)
        nets[(line["Invoice"].value, rate)] += exact(line["Net"].value)
    by_rate = defaultdict(lambda: [Decimal(0), Decimal(0)])
    for (_, rate), net in nets.items():
        # EN 16931-1, BR-CO-17: once per invoice and rate, on the summed net.
        tax = (net * (rate or 0) / 100).quantize(CENT, ROUND_HALF_UP)
        by_rate[rate][0] += net
        by_rate[rate][1] += tax
    net = sum((pair[0] for pair in by_rate.values()), Decimal(0))
    tax = sum((pair[1] for pair in by_rate.values()), Decimal(0))
    payments = rows_of(book, "Payments")
    received = sum((exact(row["Amount"].value) for row in payments), Decimal(0))
    rates = sorted(by_rate, key=lambda rate: (rate is not None, rate or 0))
    return {
        "invoices": len({number for number, _ in nets}),
        "net": f"{net:.2f}",
        "tax": f"{tax:.2f}",
        "total": f"{net + tax:.2f}",
        "payments": len(payments),
        "received": f"{received:.2f}",
        "taxes": [
            {
                "percent": None if rate is None else f"{rate.normalize():f}",
                "net": f"{by_rate[rate][0]:.2f}",
                "tax": f"{by_rate[rate][1]:.2f}",
            }
            for rate in rates
        ],
    }


def main(path):
    book = load_workbook(path)
    written = rows_of(book, "Totals")[0]
    answer = {
        "sheets": book.sheetnames,
        "faults": list(faults_of(book)),
        "recomputed": recompute(book),
        "written": {
            title.lower(): f"{exact(written[title].value):.2f}"
            for title in ("Net", "Tax", "Total", "Received")
        },
    }
    print(json.dumps(answer))


main(sys.argv[1])
