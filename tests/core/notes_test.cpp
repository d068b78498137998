// SPDX-License-Identifier: MPL-2.0
#include "core/notes.h"

#include <gtest/gtest.h>

namespace {

using Texts = std::vector<std::string>;

std::string never() {
    ADD_FAILURE() << "built although nobody listens";
    return {};
}

TEST(Notes, AreBuiltForListenersOnly) {
    core::silent.step(never);
    core::silent.remark(never);
    Texts steps, remarks;
    core::Notes(&steps, nullptr).remark(never);
    core::Notes(nullptr, &remarks).step(never);
    core::Notes(&steps, &remarks).step([] { return std::string("a step"); });
    core::Notes(&steps, &remarks).remark([] { return std::string("a remark"); });
    EXPECT_EQ(steps, Texts{"a step"});
    EXPECT_EQ(remarks, Texts{"a remark"});
}

} // namespace
