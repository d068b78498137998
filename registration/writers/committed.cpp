// SPDX-License-Identifier: MPL-2.0
#include "registration/writers/committed.h"

#include "registration/writers/writers.h"

#include <algorithm>
#include <fstream>
#include <iterator>
#include <sstream>
#include <stdexcept>
#include <string>
#include <vector>

namespace registration::writers {
namespace {

constexpr const char* function_list = "FUNCTIONS.md";
constexpr const char* id_list = "ids.txt";

std::vector<std::string> lines(std::istream& in) {
    std::vector<std::string> all;
    for (std::string line; std::getline(in, line);) all.push_back(line);
    return all;
}

std::vector<std::string> saved_ids(std::filesystem::path const& folder) {
    std::ifstream in(folder / id_list);
    if (!in) throw std::runtime_error("cannot read " + (folder / id_list).string());
    return lines(in);
}

std::vector<std::string> catalogued_ids() {
    std::stringstream ids;
    write_ids(ids);
    return lines(ids);
}

std::vector<std::string> missing(std::vector<std::string> const& some,
                                 std::vector<std::string> const& in) {
    std::vector<std::string> left;
    std::ranges::copy_if(some, std::back_inserter(left), [&](std::string const& id) {
        return std::ranges::find(in, id) == in.end();
    });
    return left;
}

void refuse(std::vector<std::string> const& ids, std::string sentence) {
    if (ids.empty()) return;
    for (std::string const& id : ids) sentence.append("\n    ").append(id);
    throw std::runtime_error(sentence);
}

void refuse_lost_ids(std::filesystem::path const& folder) {
    refuse(missing(saved_ids(folder), catalogued_ids()),
           "the catalogue has lost ids that saved sheets hold:");
}

} // namespace

void check_committed(std::filesystem::path const& folder) {
    refuse_lost_ids(folder);
    refuse(missing(catalogued_ids(), saved_ids(folder)),
           "ids.txt lacks ids (renew_function_list appends them):");
    std::ifstream in(folder / function_list);
    std::stringstream fresh;
    write_function_list(fresh);
    const std::vector<std::string> committed = lines(in), expected = lines(fresh);
    const auto [here, there] = std::ranges::mismatch(committed, expected);
    if (here == committed.end() && there == expected.end()) return;
    throw std::runtime_error("FUNCTIONS.md is stale (renew_function_list renews it) at line " +
                             std::to_string(here - committed.begin() + 1));
}

void renew_committed(std::filesystem::path const& folder) {
    refuse_lost_ids(folder);
    std::ofstream ids(folder / id_list, std::ios::app);
    for (std::string const& id : missing(catalogued_ids(), saved_ids(folder))) ids << id << '\n';
    std::ofstream functions(folder / function_list);
    write_function_list(functions);
    if (!ids.flush() || !functions.flush())
        throw std::runtime_error("cannot write into " + folder.string());
}

} // namespace registration::writers
