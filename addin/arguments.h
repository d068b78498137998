// SPDX-License-Identifier: MPL-2.0
#pragma once

#include "registration/entry.h"

#include <boost/container/small_vector.hpp>
#include <boost/container/static_vector.hpp>
#include <com/sun/star/uno/Any.hxx>
#include <com/sun/star/uno/Sequence.hxx>

#include <initializer_list>
#include <span>

namespace addin {

/// The arguments of one call as the office hands them over, turned into cells. It owns what the
/// blocks point at. Texts become UTF-8 without spaces at their ends; an empty one is a blank cell.
class Arguments {
public:
    /// Throws core::Failure, with the position in the call, for a range of more cells than a sheet
    /// has rows. A text is read up to 32,767 characters.
    explicit Arguments(std::initializer_list<css::uno::Any const*> values);
    Arguments(Arguments const&) = delete;
    Arguments& operator=(Arguments const&) = delete;

    std::span<const registration::Block> blocks() const { return {blocks_.data(), blocks_.size()}; }

private:
    void add(css::uno::Any const&);
    template<class Element>
    void add(css::uno::Sequence<css::uno::Sequence<Element>> const&);
    registration::Cell cell(css::uno::Any const&);
    registration::Cell cell(rtl::OUString const&);
    static registration::Cell cell(double number);

    boost::container::small_vector<registration::Cell, 32> cells_;
    boost::container::small_vector<char, 512> characters_;
    boost::container::static_vector<registration::Block, registration::Entry::most_arguments>
        blocks_;
};

} // namespace addin
