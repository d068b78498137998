// SPDX-License-Identifier: MPL-2.0

// office_speed PIPE: asks a running office to recalculate sheets of 100,000 rows, and prints ratios.
// office_speed.sh starts the office with both packages.

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
constexpr int repetitions = 7;

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

    /// Median seconds of a hard recalculation.
    double seconds() {
        const Reference<sheet::XCalculatable> calculation(document_, UNO_QUERY_THROW);
        calculation->calculateAll();
        std::vector<double> times;
        for (int i = 0; i < repetitions; ++i) {
            const auto start = std::chrono::steady_clock::now();
            calculation->calculateAll();
            times.push_back(
                std::chrono::duration<double>(std::chrono::steady_clock::now() - start).count());
        }
        std::ranges::sort(times);
        return times[repetitions / 2];
    }

private:
    Reference<table::XCellRange> range(sal_Int32 left, sal_Int32 top, sal_Int32 right,
                                       sal_Int32 bottom) {
        return cells_->getCellRangeByPosition(left, top, right, bottom);
    }
    Reference<lang::XComponent> document_;
    Reference<table::XCellRange> cells_;
};

std::string at(const char* column, sal_Int32 row) { return column + std::to_string(row); }

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

double measured(Reference<frame::XComponentLoader> const& office, const char* what,
                Any (*cell)(sal_Int32, sal_Int32),
                std::function<std::string(sal_Int32)> const& formula, bool array = false) {
    Sheet sheet(office);
    sheet.data(cell);
    if (array)
        sheet.array_formula(formula(0));
    else
        sheet.formulas(formula(2));
    const double seconds = sheet.seconds();
    std::printf("%-58s %8.1f ms   last value %.6g\n", what, seconds * 1e3, sheet.last_value());
    std::fflush(stdout);
    return seconds;
}

} // namespace

int main(int argc, char** argv) {
    if (argc != 2) return 2;
    try {
        const auto office = connect(argv[1]);
        const std::string fusion = "=ENTROPYCELLS.FUNCTIONS.ENTROPYFUSION",
                          nothing = "=EMPTYCELLS.FUNCTIONS.EMPTY";
        const auto call = [](std::string const& name) {
            return [name](sal_Int32 row) {
                return name + "(" + at("A", row) + ";" + at("B", row) + ";;)";
            };
        };
        const double built_in = measured(
            office, "100,000 built-in formulas =A*8.314*LN(B/300)", headed, [](sal_Int32 row) {
                return "=" + at("A", row) + "*8.314*LN(" + at("B", row) + "/300)";
            });
        const double empty =
            measured(office, "100,000 empty add-in functions, two texts", texts, call(nothing));
        const double add_in =
            measured(office, "100,000 ENTROPY.FUSION, two texts", texts, call(fusion));
        const std::string range =
            "(A1:A" + std::to_string(rows + 1) + ";B1:B" + std::to_string(rows + 1) + ";;)";
        const double empty_column = measured(
            office, "one empty add-in function of two columns", headed,
            [&](sal_Int32) { return nothing + range; }, true);
        const double column = measured(
            office, "one ENTROPY.FUSION of 100,000 rows", headed,
            [&](sal_Int32) { return fusion + range; }, true);
        std::printf("\n%-58s %6.2f   aim 1.15\n", "a cell / an empty add-in function",
                    add_in / empty);
        std::printf("%-58s %6.2f   aim 1.00\n", "one column call / 100,000 built-in formulas",
                    column / built_in);
        std::printf("%-58s %6.2f\n", "one column call / an empty one", column / empty_column);
        return 0;
    } catch (uno::Exception const& failure) {
        std::fprintf(stderr, "office_speed: %s\n",
                     OUStringToOString(failure.Message, RTL_TEXTENCODING_UTF8).getStr());
        return 1;
    }
}
