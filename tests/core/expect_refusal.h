// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "core/failure.h"

#include <gtest/gtest.h>

#include <string>

/// Expects a call to be refused, with the kind and with these words in what was given and needed.
template<class Call>
void expect_refusal(core::Failure::Kind kind, std::string const& given, std::string const& needed,
                    Call&& call) {
    try {
        call();
        ADD_FAILURE() << "not refused; needed: " << needed;
    } catch (core::Failure const& failure) {
        EXPECT_EQ(failure.kind, kind) << failure.given;
        EXPECT_NE(failure.given.find(given), std::string::npos) << failure.given;
        EXPECT_NE(failure.needed.find(needed), std::string::npos) << failure.needed;
        EXPECT_FALSE(failure.repair.empty());
    }
}

constexpr auto impossible = core::Failure::Kind::impossible;
constexpr auto unfit = core::Failure::Kind::unfit;
