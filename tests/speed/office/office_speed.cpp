// SPDX-License-Identifier: MPL-2.0

// office_speed PIPE: asks a running office to recalculate sheets of 100,000 rows, and prints ratios.
// office_speed.sh starts the office with both packages. The sheets take turns, and a ratio is the
// median of the ratios of the rounds: a machine that is busy for a while disturbs both sides.

#include <com/sun/star/beans/PropertyValue.hpp>
#include <com/sun/star/bridge/UnoUrlResolver.hpp>
#include <com/sun/star/bridge/XUnoUrlResolver.hpp>
#include <com/sun/star/container/XIndexAccess.hpp>
#include <com/sun/star/frame/Desktop.hpp>
#include <com/sun/star/frame/XComponentLoader.hpp>
#include <com/sun/star/sheet/FillDirection.hpp>
#include <com/sun/star/sheet/XArrayFormulaRange.hpp>
#include <com/sun/star/sheet/XCalculatable.hpp>
#include <com/sun/star/sheet/XCellRangeData.hpp>
#include <com/sun/star/sheet/XCellSeries.hpp>
#include <com/sun/star/sheet/XSpreadsheetDocument.hpp>
#include <com/sun/star/table/XCell.hpp>
#include <com/sun/star/table/XCellRange.hpp>
#include <com/sun/star/util/XCloseable.hpp>
#include <cppuhelper/bootstrap.hxx>

#include <algorithm>
#include <chrono>
#include <cstdio>
#include <functional>
#include <string>
#include <vector>

namespace {

using namespace css;
using rtl::OUString;
using uno::Any, uno::Reference, uno::Sequence, uno::UNO_QUERY_THROW;

constexpr sal_Int32 rows = 100'000;
constexpr int rounds = 15;

OUString text(std::string const& utf8) {
    return OUString(utf8.data(), static_cast<sal_Int32>(utf8.size()), RTL_TEXTENCODING_UTF8);
}

Reference<frame::XComponentLoader> connect(std::string const& pipe) {
    const Reference<uno::XComponentContext> local =
        cppu::defaultBootstrap_InitialComponentContext();
    const Reference<bridge::XUnoUrlResolver> resolver = bridge::UnoUrlResolver::create(local);
    const Reference<uno::XComponentContext> context(
        resolver->resolve(text("uno:pipe,name=" + pipe + ";urp;StarOffice.ComponentContext")),
        UNO_QUERY_THROW);
    return Reference<frame::XComponentLoader>(frame::Desktop::create(context), UNO_QUERY_THROW);
}

/// A sheet with a heat in A, a temperature in B (headed, or a text a row) and formulas in D.
class Sheet {
public:
    explicit Sheet(Reference<frame::XComponentLoader> const& office) {
        Sequence<beans::PropertyValue> hidden(1);
        hidden.getArray()[0].Name = "Hidden";
        hidden.getArray()[0].Value <<= true;
        document_ = office->loadComponentFromURL("private:factory/scalc", "_blank", 0, hidden);
        const Reference<sheet::XSpreadsheetDocument> book(document_, UNO_QUERY_THROW);
        const Reference<container::XIndexAccess> sheets(book->getSheets(), UNO_QUERY_THROW);
        cells_.set(sheets->getByIndex(0), UNO_QUERY_THROW);
    }
    ~Sheet() {
        try {
            Reference<util::XCloseable>(document_, UNO_QUERY_THROW)->close(true);
        } catch (uno::Exception const&) {
        }
    }

    void data(std::function<Any(sal_Int32 row, sal_Int32 column)> const& cell) {
        Sequence<Sequence<Any>> values(rows + 1);
        for (sal_Int32 row = 0; row <= rows; ++row) {
            values.getArray()[row].realloc(2);
            for (sal_Int32 column = 0; column < 2; ++column)
                values.getArray()[row].getArray()[column] = cell(row, column);
        }
        Reference<sheet::XCellRangeData>(range(0, 0, 1, rows), UNO_QUERY_THROW)
            ->setDataArray(values);
    }
    /// The formula of the first row, filled down: setting every cell is quadratic in the office.
    void formulas(std::string const& first) {
        cells_->getCellByPosition(3, 1)->setFormula(text(first));
        Reference<sheet::XCellSeries>(range(3, 1, 3, rows), UNO_QUERY_THROW)
            ->fillAuto(sheet::FillDirection_TO_BOTTOM, 1);
    }
    void array_formula(std::string const& formula) {
        Reference<sheet::XArrayFormulaRange>(range(3, 1, 3, rows), UNO_QUERY_THROW)
            ->setArrayFormula(text(formula));
    }
    double last_value() { return cells_->getCellByPosition(3, rows)->getValue(); }

    /// Seconds of one hard recalculation.
    double recalculate() {
        const auto start = std::chrono::steady_clock::now();
        Reference<sheet::XCalculatable>(document_, UNO_QUERY_THROW)->calculateAll();
        return std::chrono::duration<double>(std::chrono::steady_clock::now() - start).count();
    }

private:
    Reference<table::XCellRange> range(sal_Int32 left, sal_Int32 top, sal_Int32 right,
                                       sal_Int32 bottom) {
        return cells_->getCellRangeByPosition(left, top, right, bottom);
    }
    Reference<lang::XComponent> document_;
    Reference<table::XCellRange> cells_;
};

/// In row 0 a heading; below it numbers, or texts with their unit.
Any headed(sal_Int32 row, sal_Int32 column) {
    if (row == 0) return Any(column == 0 ? OUString("J/mol") : OUString("K"));
    return Any(column == 0 ? 1e4 + row : 300 + 0.01 * row);
}
Any texts(sal_Int32 row, sal_Int32 column) {
    if (row == 0) return Any(OUString("text"));
    return Any(column == 0 ? text(std::to_string(10000 + row) + " J/mol")
                           : text(std::to_string(300 + row % 700) + " K"));
}

/// Pressures and temperatures of superheated steam.
Any steam(sal_Int32 row, sal_Int32 column) {
    if (row == 0) return Any(column == 0 ? OUString("bar") : OUString("K"));
    return Any(column == 0 ? 1 + row % 50 : 600 + 0.002 * row);
}
Any steam_texts(sal_Int32 row, sal_Int32 column) {
    if (row == 0) return Any(OUString("text"));
    return Any(column == 0 ? text(std::to_string(1 + row % 50) + " bar")
                           : text(std::to_string(600 + row % 200) + " K"));
}

double median(std::vector<double> values) {
    std::ranges::sort(values);
    return values[values.size() / 2];
}

/// A sheet that is recalculated once a round.
struct Case {
    Case(Reference<frame::XComponentLoader> const& office, const char* title,
         Any (*cell)(sal_Int32, sal_Int32), std::string const& formula, bool array = false)
        : what(title), sheet(office) {
        sheet.data(cell);
        array ? sheet.array_formula(formula) : sheet.formulas(formula);
        sheet.recalculate();
    }
    void measure() { seconds.push_back(sheet.recalculate()); }
    void print() {
        std::printf("%-58s %8.1f ms   last value %.6g\n", what, median(seconds) * 1e3,
                    sheet.last_value());
    }

    const char* what;
    Sheet sheet;
    std::vector<double> seconds;
};

void print_ratio(const char* what, Case const& a, Case const& b, const char* aim) {
    std::vector<double> ratios;
    for (std::size_t round = 0; round < a.seconds.size(); ++round)
        ratios.push_back(a.seconds[round] / b.seconds[round]);
    std::printf("%-58s %6.2f   %s\n", what, median(ratios), aim);
}

void compare(Reference<frame::XComponentLoader> const& office) {
    const std::string fusion = "=ENTROPYCELLS.FUNCTIONS.ENTROPYFUSION",
                      nothing = "=EMPTYCELLS.FUNCTIONS.EMPTY", cells = "(A2;B2;;)",
                      last = std::to_string(rows + 1),
                      two = "(A1:A" + last + ";B1:B" + last + ";;)",
                      one = "(\"1 kJ/mol\";B1:B" + last + ";;)";
    Case built_in(office, "100,000 built-in formulas =A*8.314*LN(B/300)", headed,
                  "=A2*8.314*LN(B2/300)");
    Case built_in_array(office, "the same as one built-in array formula", headed,
                        "=A2:A" + last + "*8.314*LN(B2:B" + last + "/300)", true);
    Case empty(office, "100,000 empty add-in functions, two texts", texts, nothing + cells);
    Case add_in(office, "100,000 ENTROPY.FUSION, two texts", texts, fusion + cells);
    Case empty_two(office, "one empty add-in function of two columns", headed, nothing + two, true);
    Case two_columns(office, "one ENTROPY.FUSION of two columns", headed, fusion + two, true);
    Case empty_one(office, "one empty add-in function of one column", headed, nothing + one, true);
    Case one_column(office, "one ENTROPY.FUSION of one column", headed, fusion + one, true);
    const std::string entropy = "=ENTROPYCELLS.FUNCTIONS.ENTROPYSTEAM";
    Case steam_cells(office, "100,000 ENTROPY.STEAM, two texts", steam_texts, entropy + cells);
    Case steam_column(office, "one ENTROPY.STEAM of two columns", steam, entropy + two, true);
    Case* const all[] = {&built_in,    &built_in_array, &empty,      &add_in,      &empty_two,
                         &two_columns, &empty_one,      &one_column, &steam_cells, &steam_column};
    for (int round = 0; round < rounds; ++round)
        for (Case* measured : all) measured->measure();
    for (Case* measured : all) measured->print();
    std::printf("\n");
    print_ratio("a cell / an empty add-in function", add_in, empty, "aim 1.15");
    print_ratio("one call of one column / 100,000 built-in formulas", one_column, built_in,
                "aim 1.00");
    print_ratio("one call of two columns / 100,000 built-in formulas", two_columns, built_in,
                "aim 1.00");
    print_ratio("    an empty call of two columns / the same", empty_two, built_in,
                "the office's own part");
    print_ratio("one call of two columns / one built-in array formula", two_columns, built_in_array,
                "");
    print_ratio("one call of one column / an empty one", one_column, empty_one, "");
    print_ratio("one call of two columns / an empty one", two_columns, empty_two, "");
    print_ratio("one ENTROPY.STEAM of two columns / 100,000 cells", steam_column, steam_cells, "");
    print_ratio("    a cell of steam / an empty add-in function", steam_cells, empty, "");
}

} // namespace

int main(int argc, char** argv) {
    if (argc != 2) return 2;
    try {
        compare(connect(argv[1]));
        return 0;
    } catch (uno::Exception const& failure) {
        std::fprintf(stderr, "office_speed: %s\n",
                     OUStringToOString(failure.Message, RTL_TEXTENCODING_UTF8).getStr());
        return 1;
    }
}
