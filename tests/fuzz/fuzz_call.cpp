// SPDX-License-Identifier: MPL-2.0
#include "registration/call.h"
#include "registration/catalogue/catalogue.h"

#include <array>
#include <cstdint>
#include <cstring>
#include <string>
#include <vector>

// Any function with any blocks: whatever stands in the cells, a call answers, and its answer has as
// many cells as it says.

namespace {

using namespace registration;

class Bytes {
public:
    Bytes(const std::uint8_t* data, std::size_t size) : data_(data), size_(size) {}
    std::uint8_t byte() { return size_ ? (--size_, *data_++) : std::uint8_t{0}; }
    double number() {
        std::uint64_t bits = 0;
        for (int i = 0; i < 8; ++i) bits = bits << 8 | byte();
        double value;
        std::memcpy(&value, &bits, sizeof value);
        return value;
    }
    std::string text() {
        std::string value;
        for (std::size_t length = byte() % 40; length > 0 && size_ > 0; --length)
            value += static_cast<char>(byte());
        return value;
    }

private:
    const std::uint8_t* data_;
    std::size_t size_;
};

/// Texts that get a call past its front door, so that the fuzzer reaches what lies behind.
constexpr std::array<const char*, 32> known = {
    "K",
    "°C",
    "kJ/mol",
    "bar",
    "bar(g)",
    "mol",
    "kg",
    "u",
    "T / K",
    "300 K",
    "29.1 J/(mol·K)",
    "1 bar",
    "steps",
    "why",
    "N2",
    "%",
    "700 K",
    "90 bar",
    "2000 kJ/kg",
    "5 kJ/(kg·K)",
    "0.001 m³/kg",
    "saturated vapour",
    "steam",
    "CO2",
    "mol%",
    "rest",
    "cp / (J/(kg·K))",
    "air, cp = 1 kJ/(kg·K)",
    "virial",
    "2 H2 + O2 -> 2 H2O(g)",
    "uncertainty",
    "material | T / K: 300 400 | cp / (J/(kg·K)): 1 2 | u: 0.1 0"};

Cell cell(Bytes& bytes, std::vector<std::string>& texts) {
    switch (bytes.byte() % 5) {
    case 0:
        return {};
    case 1:
        return {Cell::Kind::number, bytes.number(), {}};
    case 2:
        return {Cell::Kind::number, static_cast<double>(bytes.byte()), {}};
    case 3:
        return {Cell::Kind::text, 0, known[bytes.byte() % known.size()]};
    default: {
        std::string text = bytes.text();
        if (text.empty()) return {};
        texts.push_back(std::move(text));
        return {Cell::Kind::text, 0, texts.back()};
    }
    }
}

} // namespace

extern "C" int LLVMFuzzerTestOneInput(const std::uint8_t* data, std::size_t size) {
    static const std::vector<Entry const*> entries = [] {
        std::vector<Entry const*> all;
        for (auto const& section : catalogue::sections())
            for (Entry const& entry : section.entries)
                if (std::string_view(entry.name) != "ADDIN.SELFTEST") all.push_back(&entry);
        return all;
    }();
    Bytes bytes(data, size);
    Entry const& entry = *entries[bytes.byte() % entries.size()];
    std::vector<std::string> texts;
    texts.reserve(8 * 64);
    std::vector<std::vector<Cell>> cells(entry.argument_count());
    std::vector<Block> blocks(entry.argument_count());
    for (std::size_t at = 0; at < blocks.size(); ++at) {
        const std::size_t rows = bytes.byte() % 9, columns = 1 + bytes.byte() % 4;
        if (rows == 0) continue;
        for (std::size_t i = 0; i < rows * columns; ++i) cells[at].push_back(cell(bytes, texts));
        blocks[at] = {cells[at].data(), rows, columns};
    }
    const Answer answer = call(entry, blocks);
    const std::size_t held =
        answer.kind == Answer::Kind::numbers ? answer.numbers.size() : answer.texts.size();
    if (held != answer.rows * answer.columns) __builtin_trap();
    return 0;
}
